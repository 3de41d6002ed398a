import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { moved, type MoveRequest } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { batch } from '../../../server/db/schema/chain.ts';
import type { AtWork } from './atWork.ts';

export interface Hop {
  batchId: string;
  from: string;
  to: string;
}

/** A batch that goes back and forth between two shelves. */
export async function hops({ db, brewery }: AtWork): Promise<(turn: number) => Hop> {
  const rows = await db
    .select({ id: batch.id, chainId: batch.chainId })
    .from(batch)
    .where(eq(batch.seasonId, brewery.seasonId))
    .orderBy(batch.chainId, batch.place);
  const [first] = rows;
  const other = rows.find(({ chainId }) => chainId !== null && chainId !== first?.chainId);
  const [one, two] = [first?.chainId, other?.chainId];
  if (!first || !one || !two) throw new Error('the board has no two shelves');
  return (turn) =>
    turn % 2 === 0
      ? { batchId: first.id, from: one, to: two }
      : { batchId: first.id, from: two, to: one };
}

export const wishOf = ({ batchId, from, to }: Hop): MoveRequest => ({
  id: randomUUID(),
  batchId,
  toChainId: to,
  afterBatchId: null,
  expectedChainId: from,
  dates: 'keep',
});

/** Moves without a browser; the answer is the revision that it made. */
export async function hopOver(at: AtWork, cookie: string, hop: Hop): Promise<number> {
  const answer = await fetch(at.url + api.moves(at.brewery.slug), {
    method: 'POST',
    headers: { cookie, origin: at.url, 'content-type': 'application/json' },
    body: JSON.stringify(wishOf(hop)),
  });
  if (answer.status !== 200) throw new Error(`a move was answered ${answer.status}`);
  return moved.parse(await answer.json()).revision;
}
