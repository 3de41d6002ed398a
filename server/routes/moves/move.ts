import { inArray } from 'drizzle-orm';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { oncePer } from '../../db/oncePer.ts';
import { change } from '../../db/schema/change.ts';
import type { Db, Tx } from '../../db/client.ts';
import type { Deps } from '../../deps.ts';
import { demandOpen, readScene } from '../board/changeBoard.ts';
import { lockBoard } from '../board/locks.ts';
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
    await lockBoard(tx, member.seasonId, shelvesOf(group));
    const now = deps.clock.now();
    const ids = group.map(({ request }) => request.id);
    const { board, inHand, made } = await readScene(tx, member, now, ids);
    demandOpen(board);
    const moves = new MoveGroup({ tx, board, inHand, now }, await madeBefore(tx, made));
    for (const wish of group) await moves.add(wish);
    return moves.store();
  });
}

const shelvesOf = (group: readonly Wish[]): string[] => [
  ...new Set(
    group
      .flatMap(({ request }) => [request.toChainId, request.expectedChainId])
      .filter((id): id is string => id !== null && id !== 'bench' && id !== 'new'),
  ),
];

/** Changes of requests that are repeated: mostly there are none. */
const madeBefore = async (tx: Tx, ids: readonly string[]) =>
  ids.length === 0
    ? []
    : tx
        .select()
        .from(change)
        .where(inArray(change.id, [...ids]));
