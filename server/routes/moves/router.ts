import { moved, moveRequest, undoRequest } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canMoveBatches } from '../../policies.ts';
import { seenMoved } from '../guests/seen.ts';
import { move } from './move.ts';
import { takeBack } from './undo.ts';

const makeMove = forMember(
  {
    name: 'moveBatch',
    method: 'post',
    path: pathOf(api.moves(':brewery')),
    summary: 'Move a batch after another one, to another shelf, a new one, or the bench',
    body: moveRequest,
    answer: moved,
    status: 200,
    problems: ['moved-elsewhere', 'place-taken', 'in-use', 'already-exists', 'season-archived'],
  },
  canMoveBatches,
  async (asked, member) => ({ body: seenMoved(member, await move(asked, member, asked.body)) }),
  'guests-too',
);

const undo = forMember(
  {
    name: 'undo',
    method: 'post',
    path: pathOf(api.undo(':brewery')),
    summary: 'Undo one’s newest move',
    body: undoRequest,
    answer: moved,
    status: 200,
    problems: ['not-undoable', 'in-use', 'season-archived'],
  },
  canMoveBatches,
  async (asked, member) => ({
    body: seenMoved(member, await takeBack(asked, member, 'undo', asked.body.changeId)),
  }),
  'guests-too',
);

const redo = forMember(
  {
    name: 'redo',
    method: 'post',
    path: pathOf(api.redo(':brewery')),
    summary: 'Redo the move that was undone last',
    body: undoRequest,
    answer: moved,
    status: 200,
    problems: ['not-undoable', 'in-use', 'season-archived'],
  },
  canMoveBatches,
  async (asked, member) => ({
    body: seenMoved(member, await takeBack(asked, member, 'redo', asked.body.changeId)),
  }),
  'guests-too',
);

export const moveRoutes = [makeMove, undo, redo];
