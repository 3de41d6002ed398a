import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { moved, type MoveRequest } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { batch } from '../../server/db/schema/chain.ts';
import { seeded } from '../support/boards.ts';
import { atWork, type AtWork } from './support/atWork.ts';
import { signInBrewers } from './support/movers.ts';
import { percentile } from './support/percentile.ts';
import { createSender, textOf, type Answer } from './support/sender.ts';
import type { Part } from './row.ts';

const SIZE = { chains: 12, perChain: 8, bench: 4, seed: 2 };
const MOVERS = 20;
const WARM = 25;
const EACH = 50;
const MOST_MS = 100;

type Standing = Pick<typeof batch.$inferSelect, 'id' | 'chainId' | 'place'>;

/** Twenty people who move batches of one season at once. */
export const moves: Part = {
  name: 'moves',
  run: () =>
    atWork(SIZE, async (at) => {
      const before = await standings(at);
      const cookies = await signInBrewers(at, MOVERS);
      const sender = createSender(`${at.url}${api.moves(at.brewery.slug)}`, MOVERS);
      const answers = await Promise.all(
        cookies.map((cookie, number) => {
          const own = before.filter((_, place) => place % MOVERS === number);
          const post = (wish: MoveRequest) => sender.post(cookie, wish);
          return keepMoving({ post, own, shelves: shelvesOf(before), seed: number + 1 });
        }),
      );
      sender.close();
      answers.flat().forEach(demandGranted);
      demandWhole(before, await standings(at));
      const p95 = percentile(
        answers.flatMap((each) => each.slice(WARM).map(({ ms }) => ms)),
        0.95,
      );
      return [
        {
          what: `a move, ${MOVERS} concurrent movers on one season, fsync on; ${MOVERS * EACH} moves, no batch lost or doubled`,
          reach: `p95 ≤ ${MOST_MS} ms`,
          measured: `p95 ${p95.toFixed(0)} ms`,
          holds: p95 <= MOST_MS,
        },
      ];
    }),
};

interface Mover {
  post(wish: MoveRequest): Promise<Answer>;
  /** Nobody else moves these, so every wish of this mover can be granted. */
  own: readonly Standing[];
  shelves: readonly string[];
  seed: number;
}

/** Moves own batches first onto a shelf, or after another own one, each as soon as the last was answered. */
async function keepMoving({ post, own, shelves, seed }: Mover): Promise<Answer[]> {
  const random = seeded(seed);
  const pick = <T>(from: readonly T[]): T => {
    const one = from[Math.floor(random() * from.length)];
    if (one === undefined) throw new Error('nothing to pick from');
    return one;
  };
  const chainOf = new Map(own.map(({ id, chainId }) => [id, chainId]));
  const answers: Answer[] = [];
  for (let made = 0; made < WARM + EACH; made += 1) {
    const { id } = pick(own);
    const mate = pick([null, ...own.filter((other) => other.id !== id && chainOf.get(other.id))]);
    const toChainId = (mate && chainOf.get(mate.id)) ?? pick(shelves);
    const answer = await post({
      id: randomUUID(),
      batchId: id,
      toChainId,
      afterBatchId: mate?.id ?? null,
      expectedChainId: chainOf.get(id) ?? null,
      dates: random() < 0.5 ? 'pull' : 'keep',
    });
    chainOf.set(id, toChainId);
    answers.push(answer);
  }
  return answers;
}

/** Anything but a granted move is a fault. */
function demandGranted(answer: Answer): void {
  const text = textOf(answer);
  if (answer.status !== 200) throw new Error(`a move was answered ${answer.status}: ${text}`);
  moved.parse(JSON.parse(text));
}

const standings = ({ db, brewery }: AtWork): Promise<Standing[]> =>
  db
    .select({ id: batch.id, chainId: batch.chainId, place: batch.place })
    .from(batch)
    .where(eq(batch.seasonId, brewery.seasonId))
    .orderBy(batch.id);

const shelvesOf = (rows: readonly Standing[]): string[] => [
  ...new Set(rows.flatMap(({ chainId }) => chainId ?? [])),
];

/** Every batch that there was, once; on each shelf and on the bench the places 0 to n − 1. */
function demandWhole(before: readonly Standing[], after: readonly Standing[]): void {
  const ids = (rows: readonly Standing[]) => rows.map(({ id }) => id).join();
  if (ids(before) !== ids(after)) throw new Error('a batch was lost or doubled');
  for (const shelf of new Set(after.map(({ chainId }) => chainId))) {
    const rows = after.filter(({ chainId }) => chainId === shelf);
    const places = rows.map(({ place }) => place ?? -1).toSorted((a, b) => a - b);
    if (places.some((place, at) => place !== at))
      throw new Error(`${shelf ?? 'the bench'} has the places ${places.join(', ')}`);
  }
}
