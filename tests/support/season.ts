import { randomUUID } from 'node:crypto';
import type { Batch } from '#shared/api/batch.ts';
import type { Board } from '#shared/api/board.ts';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import type { Person } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain, aVessel, aYeast } from './bodies.ts';
import { newcomer, PASSWORD, Visitor, type Reply } from './visitor.ts';

/** A brewery with a yeast, a vessel, two shelves and batches, and hands to work on it. */
export interface TestSeason {
  slug: string;
  head: Visitor;
  person: Person;
  yeastId: string;
  vesselId: string;
  chainA: string;
  chainB: string;
}

export async function testSeason(base: string): Promise<TestSeason> {
  const { visitor: head, slug, person } = await newcomer(base);
  const yeast = aYeast();
  const vessel = aVessel();
  const a = aChain(yeast.id, { name: 'Shelf A', vesselId: vessel.id });
  const b = aChain(yeast.id, { name: 'Shelf B' });
  await good(head.post(api.yeasts(slug), yeast));
  await good(head.post(api.vessels(slug), vessel));
  await good(head.post(api.chains(slug), a));
  await good(head.post(api.chains(slug), b));
  return { slug, head, person, yeastId: yeast.id, vesselId: vessel.id, chainA: a.id, chainB: b.id };
}

/** The body of an answer that must be a good one. */
export async function good<T = unknown>(asked: Promise<Reply>): Promise<T> {
  const { status, body } = await asked;
  if (status >= 400) throw new Error(`Answered ${status}: ${JSON.stringify(body)}`);
  return body as T;
}

export const boardOf = (visitor: Visitor, slug: string) =>
  good<Board>(visitor.get(api.board(slug)));

export async function batchOf(visitor: Visitor, slug: string, id: string): Promise<Batch> {
  const found = (await boardOf(visitor, slug)).batches.find((batch) => batch.id === id);
  if (!found) throw new Error(`No batch ${id} on the board`);
  return found;
}

/** Names on a shelf (null: the bench) in their order. */
export async function namesOn(visitor: Visitor, slug: string, chainId: string | null) {
  const { batches } = await boardOf(visitor, slug);
  return batches
    .filter((batch) => batch.chainId === chainId && batch.stage !== 'scrapped')
    .sort((x, y) => x.place - y.place)
    .map(({ name }) => name);
}

export const wish = (change: Partial<MoveRequest> & Pick<MoveRequest, 'batchId'>): MoveRequest => ({
  id: randomUUID(),
  toChainId: 'bench',
  afterBatchId: null,
  expectedChainId: null,
  dates: 'pull',
  ...change,
});

export const moveTo = (visitor: Visitor, slug: string, change: Parameters<typeof wish>[0]) =>
  good<Moved>(visitor.post(api.moves(slug), wish(change)));

/** Batches of these names, put on a shelf one after the other. */
export async function shelve(
  { head, slug }: Pick<TestSeason, 'head' | 'slug'>,
  chainId: string | null,
  bodies: readonly Parameters<typeof aBatch>[0][],
): Promise<string[]> {
  const ids: string[] = [];
  for (const body of bodies) {
    const made = aBatch(body);
    await good(head.post(api.batches(slug), made));
    if (chainId !== null)
      await moveTo(head, slug, {
        batchId: made.id,
        toChainId: chainId,
        afterBatchId: ids.at(-1) ?? null,
      });
    ids.push(made.id);
  }
  return ids;
}

/** Somebody who joined a brewery by a link, signed in. */
export async function joined(
  { head, slug }: Pick<TestSeason, 'head' | 'slug'>,
  role: 'brewer' | 'taster' | 'head-brewer',
): Promise<Visitor> {
  const { token } = await good<{ token: string }>(
    head.post(api.joinLinks(slug), { id: randomUUID(), role }),
  );
  const visitor = new Visitor(head.base);
  const email = `${randomUUID()}@saltmarsh.example`;
  await good(visitor.post(api.join(token), { name: `The ${role}`, email, password: PASSWORD }));
  return visitor;
}
