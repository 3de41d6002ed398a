import { and, eq, sql } from 'drizzle-orm';
import { yeastCreate, type YeastCreate, type YeastPatch } from '#shared/api/yeast.ts';
import { tellYeast } from '#shared/record/sentences.ts';
import { yeast, yeastLine } from '../../db/schema/stock.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { merged } from '../../http/patch.ts';
import { problem } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { one } from '../board/find.ts';
import { sayerOf } from '../board/sayer.ts';

export const addYeast =
  (body: YeastCreate): Command =>
  async ({ tx, board, member }) => {
    if (
      isRepeated(
        board.yeasts.find(({ id }) => id === body.id),
        body,
      )
    )
      return null;
    const values = { ...body, breweryId: member.brewery.id };
    demandMade(
      await tx.insert(yeast).values(values).onConflictDoNothing().returning({ id: yeast.id }),
    );
    return { what: `Added the yeast ${body.name}`, touches: [body.id] };
  };

export const editYeast =
  (id: string, version: number, patch: YeastPatch): Command =>
  async (hand) => {
    const { tx, board, member } = hand;
    const row = one(board.yeasts, id);
    demandVersion(version, row.version, row);
    const { id: _, ...fields } = merged(yeastCreate, Object.keys(yeastCreate.shape), row, patch);
    await tx
      .update(yeast)
      .set({ ...fields, version: sql`${yeast.version} + 1` })
      .where(and(eq(yeast.breweryId, member.brewery.id), eq(yeast.id, id)));
    return { ...tellYeast(sayerOf(hand), row, fields), touches: [id] };
  };

export const removeYeast =
  (id: string, version: number): Command =>
  async (hand) => {
    const row = one(hand.board.yeasts, id);
    demandVersion(version, row.version, row);
    const users = usersOf(hand, id);
    if (users.length > 0)
      throw problem('in-use', { detail: `${row.name} is used by ${users.join(', ')}` });
    // Lines of shelves that are gone; one that is still used would have been named above.
    await hand.tx.delete(yeastLine).where(eq(yeastLine.yeastId, id));
    await hand.tx
      .delete(yeast)
      .where(and(eq(yeast.breweryId, hand.member.brewery.id), eq(yeast.id, id)));
    return { what: `Deleted the yeast ${row.name}`, touches: [id] };
  };

/** Names of the shelves and batches that would be left without it. */
function usersOf({ board }: Hand, id: string): string[] {
  return [...board.chains, ...board.batches]
    .filter((user) => user.yeastId === id)
    .map((user) => user.name);
}
