import { vessel, vesselCreate, vesselPatch } from '#shared/api/vessel.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditYeastsAndVessels } from '../../policies.ts';
import { changeBoard } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { addVessel, editVessel, removeVessel } from './commands.ts';

const all = pathOf(api.vessels(':brewery'));
const single = pathOf(api.vessel(':brewery', ':id'));

const add = forMember(
  {
    name: 'addVessel',
    method: 'post',
    path: all,
    summary: 'Add a vessel',
    body: vesselCreate,
    answer: vessel,
    status: 201,
    problems: ['already-exists'],
  },
  canEditYeastsAndVessels,
  async (asked, member) => {
    const board = await changeBoard(asked, member, [], addVessel(asked.body));
    const row = one(board.vessels, asked.body.id);
    return { body: row, version: row.version };
  },
);

const edit = forMember(
  {
    name: 'editVessel',
    method: 'patch',
    path: single,
    summary: 'Change a vessel',
    body: vesselPatch,
    answer: vessel,
    status: 200,
    ifMatch: true,
  },
  canEditYeastsAndVessels,
  async (asked, member) => {
    const { id = '' } = asked.params;
    const board = await changeBoard(asked, member, [], editVessel(id, asked.version, asked.body));
    const row = one(board.vessels, id);
    return { body: row, version: row.version };
  },
);

const remove = forMember(
  {
    name: 'deleteVessel',
    method: 'delete',
    path: single,
    summary: 'Delete a vessel that nothing uses',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use'],
  },
  canEditYeastsAndVessels,
  async (asked, member) => {
    await changeBoard(asked, member, [], removeVessel(asked.params.id ?? '', asked.version));
    return {};
  },
);

export const vesselRoutes = [add, edit, remove];
