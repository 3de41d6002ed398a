import { asc, eq } from 'drizzle-orm';
import { comment as commentContract } from '#shared/api/comment.ts';
import type { MoveRequest } from '#shared/api/move.ts';
import type { Db } from '../../../server/db/client.ts';
import { batch } from '../../../server/db/schema/chain.ts';
import { change } from '../../../server/db/schema/change.ts';
import { comment } from '../../../server/db/schema/talk.ts';
import type { Side } from '../../../server/routes/moves/standing.ts';
import { expect } from '../test.ts';
import type { Answered } from './ledger.ts';

type ChangeRow = typeof change.$inferSelect;

/** What one side of an edit keeps of a batch. */
const keptOf = (side: unknown, id: string): Record<string, unknown> | null | undefined => {
  const rows = (
    side as { rows?: { batch?: Record<string, Record<string, unknown> | null> } } | null
  )?.rows;
  return rows?.batch?.[id];
};

const styleOf = (side: unknown, id: string): unknown => {
  const kept = keptOf(side, id);
  return kept === null ? null : kept?.style;
};

interface Stand {
  db: Db;
  seasonId: string;
  breweryId: string;
  answered: readonly Answered[];
}

/** Holds what was answered against what the record and the rows say. */
export async function expectAllStandsOnce(stand: Stand): Promise<void> {
  const { db, seasonId, answered } = stand;
  const rows = await db
    .select()
    .from(change)
    .where(eq(change.seasonId, seasonId))
    .orderBy(asc(change.seq));
  expectMoves(rows, answered);
  expectEdits(rows, answered);
  expectTurns(rows);
  await expectStyles(stand, rows);
  await expectComments(stand);
}

const movedNothing = ({ answer }: Answered) =>
  (answer as { batches?: readonly unknown[] } | null)?.batches?.length === 0;

/** Whether the record tells of a batch where a move wished to have it. */
function stoodThere(rows: readonly ChangeRow[], wish: MoveRequest): boolean {
  const chainId = wish.toChainId === 'bench' ? null : wish.toChainId;
  const afterId = chainId === null ? null : wish.afterBatchId;
  return rows
    .flatMap(({ before, after }) => [before, after] as (Partial<Side> | null)[])
    .flatMap((side) => side?.batches ?? [])
    .some((is) => is.id === wish.batchId && is.chainId === chainId && is.afterId === afterId);
}

const changeIdOf = ({ answer }: Answered) => (answer as { changeId?: string } | null)?.changeId;

function expectMoves(rows: readonly ChangeRow[], answered: readonly Answered[]): void {
  for (const one of answered.filter(({ path }) => path.endsWith('/moves'))) {
    const wish = one.body as MoveRequest;
    const lines = rows.filter(({ id }) => id === wish.id);
    if (movedNothing(one)) {
      // Somebody else had put it there just before.
      expect(lines, 'a move that found nothing to move writes no line').toEqual([]);
      expect(stoodThere(rows, wish), 'what was not moved stood where it was wanted').toBe(true);
    } else expect(lines, 'an answered move stands once').toHaveLength(1);
  }
  for (const one of answered.filter(({ path }) => /\/(undo|redo)$/.test(path))) {
    const kind = one.path.endsWith('undo') ? 'undo' : 'redo';
    const { changeId } = one.body as { changeId: string };
    if (one.answer !== null) expect(changeIdOf(one)).toBe(changeId);
    const turned = rows.filter((row) => row.ofChange === changeId && row.kind === kind);
    expect(turned.length, `an answered ${kind} stands`).toBeGreaterThanOrEqual(1);
  }
}

/** Every edit set a style that no other did. */
function expectEdits(rows: readonly ChangeRow[], answered: readonly Answered[]): void {
  for (const { path, body } of answered.filter((one) => one.method === 'PATCH')) {
    const id = /\/batches\/([^/]+)$/.exec(path)?.[1];
    const style = (body as { style?: string } | null)?.style;
    if (id === undefined || style === undefined) continue;
    const edits = rows.filter((row) => row.kind === 'edit' && styleOf(row.after, id) === style);
    expect(edits, `the answered edit “${style}” stands once`).toHaveLength(1);
  }
}

/** A change is undone, then redone, then undone: never twice in a row. */
function expectTurns(rows: readonly ChangeRow[]): void {
  for (const { id } of rows) {
    const turns = rows.filter((row) => row.ofChange === id).map(({ kind }) => kind);
    expect(turns).toEqual(turns.map((_, at) => (at % 2 === 0 ? 'undo' : 'redo')));
  }
}

/** Each change of a style begins where the last one ended, and the row is where the last one left it. */
async function expectStyles({ db, seasonId }: Stand, rows: readonly ChangeRow[]): Promise<void> {
  const stands = await db
    .select({ id: batch.id, style: batch.style })
    .from(batch)
    .where(eq(batch.seasonId, seasonId));
  const touched = new Set(rows.flatMap(({ touches }) => touches));
  const now = new Map<string, unknown>(stands.map(({ id, style }) => [id, style]));
  for (const id of touched) {
    let last: unknown;
    for (const row of rows) {
      const [was, is] = [styleOf(row.before, id), styleOf(row.after, id)];
      if (was === undefined && is === undefined) continue;
      if (last !== undefined) expect(was, `before “${row.what}”`).toEqual(last);
      last = is;
    }
    if (last !== undefined)
      expect(now.get(id) ?? null, 'the row as its last change left it').toEqual(last);
  }
}

/** Each answered version of a comment was given once, and the last one is what stands. */
async function expectComments({ db, breweryId, answered }: Stand): Promise<void> {
  const rows = await db.select().from(comment).where(eq(comment.breweryId, breweryId));
  const said = answered
    .filter(({ path }) => /\/comments(\/[^/]+)?$/.test(path) && !path.endsWith('/seen'))
    .flatMap(({ answer }) => commentContract.safeParse(answer).data ?? []);
  for (const id of new Set(said.map((each) => each.id))) {
    const versions = said.filter((each) => each.id === id);
    const row = rows.filter((each) => each.id === id);
    expect(row, 'an answered comment stands once').toHaveLength(1);
    const texts = new Map(versions.map(({ version, text }) => [version, text]));
    for (const { version, text } of versions)
      expect(text, 'one version says one thing').toBe(texts.get(version));
    const newest = Math.max(...texts.keys());
    expect(row[0]?.version).toBeGreaterThanOrEqual(newest);
    if (row[0]?.version === newest)
      expect(row[0].deletedAt === null ? row[0].text : null).toBe(texts.get(newest));
  }
  const texts = rows.map(({ text }) => text);
  expect(texts, 'nothing is said twice').toHaveLength(new Set(texts).size);
}
