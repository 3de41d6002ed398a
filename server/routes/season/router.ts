import { z } from 'zod';
import {
  listedSeason,
  season as contract,
  seasonCreate,
  seasonPatch,
} from '#shared/api/brewery.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditSeason, canRead } from '../../policies.ts';
import { changeBoard } from '../board/changeBoard.ts';
import { editSeason } from './edit.ts';
import { archive, deleteSeason, makeCurrent } from './keep.ts';
import { listSeasons } from './list.ts';
import { makeSeason } from './make.ts';

const all = pathOf(api.seasons(':brewery'));
const single = pathOf(api.season(':brewery', ':season'));
const archived = pathOf(api.seasonArchive(':brewery', ':season'));

const list = forMember(
  {
    name: 'listSeasons',
    method: 'get',
    path: all,
    summary: 'The brewery’s seasons: the current one, the others, the archived',
    answer: z.array(listedSeason),
    status: 200,
  },
  canRead,
  async ({ db }, { brewery }) => ({ body: await listSeasons(db, brewery.id) }),
);

const add = forMember(
  {
    name: 'addSeason',
    method: 'post',
    path: all,
    summary: 'Make a season, empty or with the plan of another one, its dates shifted',
    body: seasonCreate,
    answer: listedSeason,
    status: 201,
    problems: ['already-exists'],
  },
  canEditSeason,
  async (asked, member) => {
    const body = await makeSeason(asked, member, asked.body);
    return { body, version: body.version };
  },
);

const edit = forMember(
  {
    name: 'editSeason',
    method: 'patch',
    path: single,
    summary: 'Change the season’s name, its days, its brew days and its blocked days',
    body: seasonPatch,
    answer: contract,
    status: 200,
    ifMatch: true,
    problems: ['season-archived'],
  },
  canEditSeason,
  async (asked, member) => {
    const command = editSeason(asked.version, asked.body);
    const { season } = await changeBoard(asked, member, [], command);
    return { body: season, version: season.version };
  },
);

const remove = forMember(
  {
    name: 'deleteSeason',
    method: 'delete',
    path: single,
    summary: 'Delete a season on which nothing stands',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use'],
  },
  canEditSeason,
  async (asked, member) => {
    await deleteSeason(asked, member, asked.version);
    return {};
  },
);

const choose = forMember(
  {
    name: 'makeSeasonCurrent',
    method: 'post',
    path: pathOf(api.currentSeason(':brewery', ':season')),
    summary: 'Show this season under the brewery’s own address',
    answer: listedSeason,
    status: 200,
    ifMatch: true,
    problems: ['season-archived'],
  },
  canEditSeason,
  async (asked, member) => {
    const body = await makeCurrent(asked, member, asked.version);
    return { body, version: body.version };
  },
);

const putAway = forMember(
  {
    name: 'archiveSeason',
    method: 'post',
    path: archived,
    summary: 'Put a season away: it is read, and nothing on it is changed',
    answer: listedSeason,
    status: 200,
    ifMatch: true,
    problems: ['in-use'],
  },
  canEditSeason,
  async (asked, member) => {
    const body = await archive(asked, member, asked.version, true);
    return { body, version: body.version };
  },
);

const takeOut = forMember(
  {
    name: 'reopenSeason',
    method: 'delete',
    path: archived,
    summary: 'Take a season out of the archive',
    answer: listedSeason,
    status: 200,
    ifMatch: true,
  },
  canEditSeason,
  async (asked, member) => {
    const body = await archive(asked, member, asked.version, false);
    return { body, version: body.version };
  },
);

export const seasonRoutes = [list, add, edit, remove, choose, putAway, takeOut];
