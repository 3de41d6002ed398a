import { inArray } from 'drizzle-orm';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { oncePer } from '../../db/oncePer.ts';
import { change } from '../../db/schema/change.ts';
import type { Db, Tx } from '../../db/client.ts';
import type { Deps } from '../../deps.ts';
import { demandOpen, readBoard } from '../board/changeBoard.ts';
import { lockSeason, lockShelves } from '../board/locks.ts';
import { poursInHand } from '../pour/inHand.ts';
import { createLane, type Lane, type Outcome } from './lane.ts';
import { MoveGroup } from './moveGroup.ts';

export interface Wish {
  deps: Pick<Deps, 'db' | 'clock'>;
  member: Member;
  request: MoveRequest;
}

/**
 * One move: order and dates together. Moves of one season that are wished at the same time are made
 * one after the other in one transaction: they would only wait for each other's locks.
 */
export function move(deps: Wish['deps'], member: Member, request: MoveRequest): Promise<Moved> {
  return laneOf(deps.db, member.seasonId).add({ deps, member, request });
}

const lanesOf = oncePer((_db: Db) => new Map<string, Lane<Wish, Moved>>());

function laneOf(db: Db, seasonId: string): Lane<Wish, Moved> {
  const lanes = lanesOf(db);
  for (const [id, lane] of lanes) if (lane.isEmpty()) lanes.delete(id);
  const lane = lanes.get(seasonId) ?? createLane({ grant, goesWith });
  lanes.set(seasonId, lane);
  return lane;
}

const MOST = 32;

/** A new shelf is a row of its own, and a repeated request must see what became of the first. */
function goesWith({ request }: Wish, group: readonly Wish[]): boolean {
  const isPlain = (other: MoveRequest) => other.newChain === undefined;
  return (
    group.length < MOST &&
    isPlain(request) &&
    group.every(({ request: other }) => isPlain(other) && other.id !== request.id)
  );
}

async function grant(group: readonly Wish[]): Promise<Outcome<Moved>[]> {
  const [first] = group;
  if (!first) return [];
  const { deps, member } = first;
  return inTransaction(deps.db, async (tx) => {
    await lockShelves(tx, member.seasonId, shelvesOf(group));
    await lockSeason(tx, member.seasonId);
    const now = deps.clock.now();
    const board = await readBoard(tx, member, now);
    demandOpen(board);
    const made = new MoveGroup(
      { tx, board, now },
      await madeBefore(tx, group),
      await poursInHand(tx, board),
    );
    for (const wish of group) await made.add(wish);
    return made.store();
  });
}

const shelvesOf = (group: readonly Wish[]): string[] => [
  ...new Set(
    group
      .flatMap(({ request }) => [request.toChainId, request.expectedChainId])
      .filter((id): id is string => id !== null && id !== 'bench' && id !== 'new'),
  ),
];

/** Changes that have one of these ids already: the requests are repeated ones. */
const madeBefore = (tx: Tx, group: readonly Wish[]) =>
  tx
    .select()
    .from(change)
    .where(
      inArray(
        change.id,
        group.map(({ request }) => request.id),
      ),
    );
