import {
  acceptanceRequest,
  batch,
  batchCreate,
  batchPatch,
  linkPatch,
  stageRequest,
} from '#shared/api/batch.ts';
import { api } from '#shared/api/urls.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Answer, Asked } from '../../http/operation.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canAcceptHolds, canEditBatches } from '../../policies.ts';
import { changeBoard, type Command } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { acceptHold, withdrawAcceptance } from './accept.ts';
import { seenBy, withinChain } from '../guests/seen.ts';
import { addBatch, editBatch, editLink, removeBatch } from './edit.ts';
import { setStage } from './stage.ts';

const all = pathOf(api.batches(':brewery'));
const single = pathOf(api.batch(':brewery', ':id'));
const stage = pathOf(api.batchStage(':brewery', ':id'));
const link = pathOf(api.link(':brewery', ':id'));
const acceptance = pathOf(api.acceptance(':brewery', ':id'));

const idOf = (asked: Asked<unknown>) => asked.params.id ?? '';

/** The batch as the command left it. Its shelf is locked where others may move up. */
async function answerBatch(
  asked: Asked<unknown>,
  member: Member,
  id: string,
  command: Command,
  shelves: 'none' | 'all' = 'none',
): Promise<Answer> {
  const board = await changeBoard(asked, member, shelves === 'all' ? 'all' : [], command);
  const row = one(seenBy(member, board).batches, id);
  return { body: row, version: row.version };
}

const changed = { answer: batch, status: 200, ifMatch: true } as const;

const add = forMember(
  {
    name: 'addBatch',
    method: 'post',
    path: all,
    summary: 'Add a batch to the bench',
    body: batchCreate,
    answer: batch,
    status: 201,
    problems: ['already-exists', 'season-archived'],
  },
  canEditBatches,
  (asked, member) => answerBatch(asked, member, asked.body.id, addBatch(asked.body)),
);

const edit = forMember(
  {
    ...changed,
    name: 'editBatch',
    method: 'patch',
    path: single,
    summary: 'Change what is planned of a batch',
    body: batchPatch,
    problems: ['season-archived'],
  },
  canEditBatches,
  (asked, member) => {
    const command = editBatch(idOf(asked), asked.version, asked.body);
    const within = withinChain(member, idOf(asked), asked.body, command);
    return answerBatch(asked, member, idOf(asked), within);
  },
  'guests-too',
);

const remove = forMember(
  {
    name: 'deleteBatch',
    method: 'delete',
    path: single,
    summary: 'Delete a batch that was never brewed',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canEditBatches,
  async (asked, member) => {
    await changeBoard(asked, member, 'all', removeBatch(idOf(asked), asked.version));
    return {};
  },
);

const changeStage = forMember(
  {
    ...changed,
    name: 'setStage',
    method: 'post',
    path: stage,
    summary: 'Brewed, racked, scrapped, or back to pencilled, with what was read',
    body: stageRequest,
    problems: ['in-use', 'season-archived'],
  },
  canEditBatches,
  (asked, member) => {
    const command = setStage(idOf(asked), asked.version, asked.body);
    return answerBatch(asked, member, idOf(asked), command, 'all');
  },
);

const changeLink = forMember(
  {
    ...changed,
    name: 'editLink',
    method: 'patch',
    path: link,
    summary: 'Change how the cake of the batch before goes under this one',
    body: linkPatch,
    problems: ['season-archived'],
  },
  canEditBatches,
  (asked, member) => {
    const command = editLink(idOf(asked), asked.version, asked.body);
    const within = withinChain(member, idOf(asked), {}, command);
    return answerBatch(asked, member, idOf(asked), within);
  },
  'guests-too',
);

const accept = forMember(
  {
    ...changed,
    name: 'acceptHold',
    method: 'put',
    path: acceptance,
    summary: 'Accept a link’s hold, with a reason',
    body: acceptanceRequest,
    problems: ['not-acceptable', 'season-archived'],
  },
  canAcceptHolds,
  (asked, member) => {
    const command = acceptHold(idOf(asked), asked.version, asked.body.reason);
    return answerBatch(asked, member, idOf(asked), command);
  },
);

const withdraw = forMember(
  {
    ...changed,
    name: 'withdrawAcceptance',
    method: 'delete',
    path: acceptance,
    summary: 'Take an acceptance back',
    problems: ['season-archived'],
  },
  canAcceptHolds,
  (asked, member) =>
    answerBatch(asked, member, idOf(asked), withdrawAcceptance(idOf(asked), asked.version)),
);

export const batchRoutes = [add, edit, remove, changeStage, changeLink, accept, withdraw];
