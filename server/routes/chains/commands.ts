import { and, eq, sql } from 'drizzle-orm';
import type { Batch } from '#shared/api/batch.ts';
import type { Chain, ChainCreate, ChainPatch } from '#shared/api/chain.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import { tellChain } from '#shared/record/sentences.ts';
import { chain } from '../../db/schema/chain.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { problem } from '../../problems.ts';
import { demandNoBranch } from '../batches/edit.ts';
import { endOf, linkColumns, matesOn, writeBatch } from '../batches/rows.ts';
import type { Command } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { demandStock, one } from '../board/find.ts';
import { demandNothingHangs } from '../board/hanging.ts';
import { sayerOf } from '../board/sayer.ts';
import { startColumns } from './present.ts';
import { demandStart, lineFor } from './start.ts';

/** A new shelf stands last on the board. */
export const addChain =
  (body: ChainCreate): Command =>
  async (hand) => {
    if (
      isRepeated(
        hand.board.chains.find(({ id }) => id === body.id),
        body,
      )
    )
      return null;
    await insertChain(hand, body);
    return { what: `Added the shelf ${body.name}`, touches: [body.id] };
  };

export async function insertChain(hand: Hand, body: ChainCreate, at = ''): Promise<void> {
  demandStock(hand.board, body, at);
  demandStart(hand.board, body, at);
  const position = Math.max(-1, ...hand.board.chains.map((each) => each.position)) + 1;
  await insertChainRow(hand, { ...body, position });
}

/** Also puts a shelf up again that an undo had taken down. */
export async function insertChainRow(
  hand: Hand,
  row: Omit<Chain, 'version' | 'lineId'>,
): Promise<void> {
  const { id, name, yeastId, vesselId, position, start } = row;
  const made = await hand.tx
    .insert(chain)
    .values({
      id,
      name,
      yeastId,
      vesselId,
      position,
      ...startColumns(start),
      breweryId: hand.member.brewery.id,
      seasonId: hand.member.seasonId,
      lineId: await lineFor(hand, row),
    })
    .onConflictDoNothing({ target: chain.id })
    .returning({ id: chain.id });
  demandMade(made);
}

export const editChain =
  (id: string, version: number, patch: ChainPatch): Command =>
  async (hand) => {
    const { board } = hand;
    const row = one(board.chains, id);
    demandVersion(version, row.version, row);
    const next = { ...row, ...patch };
    demandStock(board, patch);
    if (patch.start !== undefined || patch.yeastId !== undefined) demandStart(board, next);
    if (patch.yeastId !== undefined) demandNoOtherYeast(hand, row, patch.yeastId);
    await writeChain(hand, next);
    if (patch.position !== undefined) await reorder(hand, row, patch.position);
    if (patch.start !== undefined) await unsettleFirst(hand, row, next);
    return { ...tellChain(sayerOf(hand), row, next), touches: [id] };
  };

async function writeChain(hand: Hand, row: Chain): Promise<void> {
  const { name, yeastId, vesselId, start } = row;
  const lineId = await lineFor(hand, row);
  await hand.tx
    .update(chain)
    .set({
      name,
      yeastId,
      vesselId,
      lineId,
      ...startColumns(start),
      version: sql`${chain.version} + 1`,
    })
    .where(and(eq(chain.seasonId, hand.board.season.id), eq(chain.id, row.id)));
}

/** Shelves that live on this one's cakes have its yeast: they would be told apart from it. */
function demandNoOtherYeast({ board }: Hand, row: Chain, yeastId: string): void {
  if (yeastId === row.yeastId) return;
  for (const mate of matesOn(board, row.id)) demandNoBranch(board.chains, mate);
}

async function reorder({ tx, board }: Hand, row: Chain, position: number): Promise<void> {
  const others = board.chains.filter(({ id }) => id !== row.id);
  const order = [...others.slice(0, position), row, ...others.slice(position)];
  for (const [place, each] of order.entries())
    if (each.position !== place)
      await tx.update(chain).set({ position: place }).where(eq(chain.id, each.id));
}

/** The first batch stands on another cake when the start changes, so the facts of its link go. */
async function unsettleFirst({ tx, board }: Hand, was: Chain, is: Chain): Promise<void> {
  const cakeOf = ({ start }: Chain) => (start.kind === 'cake' ? start.batchId : null);
  const first = matesOn(board, was.id)[0];
  if (first && cakeOf(was) !== cakeOf(is))
    await writeBatch(tx, board, first.id, linkColumns(UNSETTLED_LINK));
}

/** Its pencilled batches go back to the bench; one that was brewed keeps its shelf, and so does its talk. */
export const removeChain =
  (id: string, version: number): Command =>
  async (hand) => {
    const { tx, board } = hand;
    const row = one(board.chains, id);
    demandVersion(version, row.version, row);
    const mates = matesOn(board, id);
    demandOnlyPencilled(hand, mates);
    await demandNothingHangs(hand, [id]);
    let place = endOf(board, null);
    for (const mate of mates) {
      const columns = { chainId: null, place, ...linkColumns(UNSETTLED_LINK) };
      await writeBatch(tx, board, mate.id, columns);
      place += 1;
    }
    await tx.delete(chain).where(and(eq(chain.seasonId, board.season.id), eq(chain.id, id)));
    await closeRanks(hand, row);
    const touches = [id, ...mates.map((mate) => mate.id)];
    return { what: `Deleted the shelf ${row.name}`, touches };
  };

function demandOnlyPencilled({ board }: Hand, mates: readonly Batch[]): void {
  const brewed = mates.find(({ stage }) => stage !== 'pencilled');
  if (brewed)
    throw problem('in-use', { detail: `${brewed.name} is ${brewed.stage}, so its shelf stays` });
  for (const mate of mates) demandNoBranch(board.chains, mate);
}

async function closeRanks({ tx, board }: Hand, gone: Chain): Promise<void> {
  const rest = board.chains.filter(({ id }) => id !== gone.id);
  for (const [position, each] of rest.entries())
    if (each.position !== position)
      await tx.update(chain).set({ position }).where(eq(chain.id, each.id));
}
