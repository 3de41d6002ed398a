import { board, type Board } from '#shared/api/board.ts';
import { api } from '#shared/api/urls.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Clock } from '../../clock.ts';
import type { Db } from '../../db/client.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { abilitiesOf, canRead } from '../../policies.ts';
import { notFound } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import { presentBrewery } from '../brewery/present.ts';
import { newestOwn } from '../moves/newest.ts';
import { unreadByChain } from '../comments/read.ts';
import { guestShelves } from '../guests/shelves.ts';
import { seenBy } from '../guests/seen.ts';
import { loadBoardRows } from './load.ts';

/** A season's board, whole, in a handful of queries. */
async function readBoard(db: Db, clock: Clock, member: Member): Promise<Board> {
  const { brewery, seasonId, person, role } = member;
  const [rows, newest, unread, guests] = await Promise.all([
    loadBoardRows(db, brewery.id, seasonId),
    newestOwn(db, seasonId, person.id),
    member.guestOf ? {} : unreadByChain(db, brewery.id, person.id),
    guestShelves(db, member),
  ]);
  if (!rows) throw notFound();
  const today = dayIn(brewery.timeZone, clock.now());
  return {
    brewery: presentBrewery(brewery),
    me: { personId: person.id, role, can: abilitiesOf(member) },
    ...seenBy(member, { ...rows, today }),
    ...newest,
    unread,
    guests,
  };
}

export const boardRoutes = [
  forMember(
    {
      name: 'readBoard',
      method: 'get',
      path: pathOf(api.board(':brewery')),
      summary: 'A season’s board: everything the verdicts are computed from',
      answer: board,
      status: 200,
    },
    canRead,
    async ({ db, clock }, member) => ({ body: await readBoard(db, clock, member) }),
    'guests-too',
  ),
];
