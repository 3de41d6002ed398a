import { yeast, yeastCreate, yeastPatch } from '#shared/api/yeast.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditYeastsAndVessels } from '../../policies.ts';
import { changeBoard } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { addYeast, editYeast, removeYeast } from './commands.ts';

const all = pathOf(api.yeasts(':brewery'));
const single = pathOf(api.yeast(':brewery', ':id'));

const add = forMember(
  {
    name: 'addYeast',
    method: 'post',
    path: all,
    summary: 'Add a yeast',
    body: yeastCreate,
    answer: yeast,
    status: 201,
    problems: ['already-exists'],
  },
  canEditYeastsAndVessels,
  async (asked, member) => {
    const board = await changeBoard(asked, member, [], addYeast(asked.body));
    const row = one(board.yeasts, asked.body.id);
    return { body: row, version: row.version };
  },
);

const edit = forMember(
  {
    name: 'editYeast',
    method: 'patch',
    path: single,
    summary: 'Change a yeast',
    body: yeastPatch,
    answer: yeast,
    status: 200,
    ifMatch: true,
  },
  canEditYeastsAndVessels,
  async (asked, member) => {
    const { id = '' } = asked.params;
    const board = await changeBoard(asked, member, [], editYeast(id, asked.version, asked.body));
    const row = one(board.yeasts, id);
    return { body: row, version: row.version };
  },
);

const remove = forMember(
  {
    name: 'deleteYeast',
    method: 'delete',
    path: single,
    summary: 'Delete a yeast that nothing uses',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use'],
  },
  canEditYeastsAndVessels,
  async (asked, member) => {
    await changeBoard(asked, member, [], removeYeast(asked.params.id ?? '', asked.version));
    return {};
  },
);

export const yeastRoutes = [add, edit, remove];
