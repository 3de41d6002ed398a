import { batchNote, noteCreate, noteWrite } from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import type { Asked } from '../../http/operation.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canWriteRecords } from '../../policies.ts';
import { addNote, editNote, removeNote } from './notes.ts';

const all = pathOf(api.notes(':brewery', ':id'));
const single = pathOf(api.note(':brewery', ':id', ':noteId'));

const named = ({ params, version }: Asked<unknown>) => ({
  batchId: params.id,
  noteId: params.noteId,
  version,
});

const add = forMember(
  {
    name: 'addBatchNote',
    method: 'post',
    path: all,
    summary: 'Write a note on a batch',
    body: noteCreate,
    answer: batchNote,
    status: 201,
    problems: ['already-exists', 'in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    const body = await addNote(asked, member, asked.params.id, asked.body);
    return { body, version: body.version };
  },
);

const edit = forMember(
  {
    name: 'editBatchNote',
    method: 'put',
    path: single,
    summary: 'Change one’s own note',
    body: noteWrite,
    answer: batchNote,
    status: 200,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    const body = await editNote(asked, member, named(asked), asked.body);
    return { body, version: body.version };
  },
);

const remove = forMember(
  {
    name: 'deleteBatchNote',
    method: 'delete',
    path: single,
    summary: 'Delete a note',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    await removeNote(asked, member, named(asked));
    return {};
  },
);

export const noteRoutes = [add, edit, remove];
