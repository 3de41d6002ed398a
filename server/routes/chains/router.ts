import { chain, chainCreate, chainPatch, datesPulled } from '#shared/api/chain.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditBatches, canEditChains } from '../../policies.ts';
import { changeBoard } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { addChain, editChain, removeChain } from './commands.ts';
import { pullDates } from './pull.ts';

const all = pathOf(api.chains(':brewery'));
const single = pathOf(api.chain(':brewery', ':id'));

const add = forMember(
  {
    name: 'addChain',
    method: 'post',
    path: all,
    summary: 'Put up a shelf for a chain',
    body: chainCreate,
    answer: chain,
    status: 201,
    problems: ['already-exists', 'season-archived'],
  },
  canEditChains,
  async (asked, member) => {
    const board = await changeBoard(asked, member, 'all', addChain(asked.body));
    const row = one(board.chains, asked.body.id);
    return { body: row, version: row.version };
  },
);

const edit = forMember(
  {
    name: 'editChain',
    method: 'patch',
    path: single,
    summary: 'Change a chain’s name, yeast, vessel, start or place among the shelves',
    body: chainPatch,
    answer: chain,
    status: 200,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canEditChains,
  async (asked, member) => {
    const { id = '' } = asked.params;
    const board = await changeBoard(asked, member, 'all', editChain(id, asked.version, asked.body));
    const row = one(board.chains, id);
    return { body: row, version: row.version };
  },
);

const remove = forMember(
  {
    name: 'deleteChain',
    method: 'delete',
    path: single,
    summary: 'Take a shelf down; its pencilled batches go back to the bench',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canEditChains,
  async (asked, member) => {
    await changeBoard(asked, member, 'all', removeChain(asked.params.id ?? '', asked.version));
    return {};
  },
);

const pull = forMember(
  {
    name: 'pullDates',
    method: 'post',
    path: pathOf(api.pullDates(':brewery', ':id')),
    summary: 'Brew every pencilled batch of a chain on the day the yeast before it is taken',
    answer: datesPulled,
    status: 200,
    problems: ['season-archived'],
  },
  canEditBatches,
  async (asked, member) => {
    const { id = '' } = asked.params;
    const board = await changeBoard(asked, member, 'all', pullDates(id));
    return { body: { revision: board.season.revision } };
  },
);

export const chainRoutes = [add, edit, remove, pull];
