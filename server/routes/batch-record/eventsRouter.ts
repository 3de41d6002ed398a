import { batchEvent, eventCreate, eventWrite } from '#shared/api/reading.ts';
import { api } from '#shared/api/urls.ts';
import type { Asked } from '../../http/operation.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canWriteRecords } from '../../policies.ts';
import { addEvent, editEvent, removeEvent } from './events.ts';

const all = pathOf(api.events(':brewery', ':id'));
const single = pathOf(api.event(':brewery', ':id', ':eventId'));

const named = ({ params, version }: Asked<unknown>) => ({
  batchId: params.id,
  eventId: params.eventId,
  version,
});

const add = forMember(
  {
    name: 'addBatchEvent',
    method: 'post',
    path: all,
    summary: 'Plan something for a batch, or note that it was done',
    body: eventCreate,
    answer: batchEvent,
    status: 201,
    problems: ['already-exists', 'in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    const body = await addEvent(asked, member, asked.params.id, asked.body);
    return { body, version: body.version };
  },
);

const edit = forMember(
  {
    name: 'editBatchEvent',
    method: 'put',
    path: single,
    summary: 'Change it, or note that it was done',
    body: eventWrite,
    answer: batchEvent,
    status: 200,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    const body = await editEvent(asked, member, named(asked), asked.body);
    return { body, version: body.version };
  },
);

const remove = forMember(
  {
    name: 'deleteBatchEvent',
    method: 'delete',
    path: single,
    summary: 'Delete it',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canWriteRecords,
  async (asked, member) => {
    await removeEvent(asked, member, named(asked));
    return {};
  },
);

export const eventRoutes = [add, edit, remove];
