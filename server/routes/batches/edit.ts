import { and, eq } from 'drizzle-orm';
import {
  batchCreate,
  type BatchCreate,
  type BatchPatch,
  type LinkPatch,
} from '#shared/api/batch.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import { tellBatch, tellLink } from '#shared/record/sentences.ts';
import { batch } from '../../db/schema/chain.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { merged } from '../../http/patch.ts';
import { problem } from '../../problems.ts';
import type { Command } from '../board/changeBoard.ts';
import { demandStock, one } from '../board/find.ts';
import { demandNothingHangs } from '../board/hanging.ts';
import { sayerOf } from '../board/sayer.ts';
import { demandNoPour } from '../pour/onRecord.ts';
import { demandPart } from './part.ts';
import { closeUp, endOf, linkColumns, writeBatch } from './rows.ts';

/** A new batch stands last on the bench. */
export const addBatch =
  (body: BatchCreate): Command =>
  async ({ tx, board, member, now }) => {
    if (
      isRepeated(
        board.batches.find(({ id }) => id === body.id),
        body,
      )
    )
      return null;
    demandStock(board, body);
    const values = {
      ...body,
      ...linkColumns(UNSETTLED_LINK),
      breweryId: member.brewery.id,
      seasonId: member.seasonId,
      place: endOf(board, null),
      createdAt: now,
    };
    demandMade(
      await tx
        .insert(batch)
        .values(values)
        .onConflictDoNothing({ target: batch.id })
        .returning({ id: batch.id }),
    );
    return { what: `Added ${body.name}`, touches: [body.id] };
  };

export const editBatch =
  (id: string, version: number, patch: BatchPatch): Command =>
  async (hand) => {
    const { tx, board } = hand;
    const row = one(board.batches, id);
    demandVersion(version, row.version, row);
    const { id: _, ...facts } = merged(batchCreate, Object.keys(batchCreate.shape), row, patch);
    demandStock(board, patch);
    await writeBatch(tx, board, id, facts);
    return { ...tellBatch(sayerOf(hand), row, { ...row, ...facts }), touches: [id] };
  };

/** Facts of the link from the batch before. A kept part and "all of it" exclude each other. */
export const editLink =
  (id: string, version: number, patch: LinkPatch): Command =>
  async (hand) => {
    const { tx, board } = hand;
    const row = one(board.batches, id);
    demandVersion(version, row.version, row);
    const link = { ...row.link, ...patch };
    if (patch.keepWhole) link.keepL = null;
    else if (typeof patch.keepL === 'number') {
      demandPart(hand, id, patch.keepL);
      link.keepWhole = false;
    }
    await writeBatch(tx, board, id, linkColumns(link));
    return { ...tellLink(sayerOf(hand), row.name, row.link, link), touches: [id] };
  };

/** Only what was never brewed, and of which nothing was written, can be deleted; the rest is scrapped. */
export const removeBatch =
  (id: string, version: number): Command =>
  async (hand) => {
    const { tx, board } = hand;
    const row = one(board.batches, id);
    demandVersion(version, row.version, row);
    if (row.stage === 'fermenting' || row.stage === 'racked')
      throw problem('in-use', { detail: `${row.name} has been brewed: scrap it instead` });
    await demandNoPour(tx, [id]);
    await demandNothingHangs(hand, [id]);
    demandNoBranch(board.chains, row);
    if (row.stage !== 'scrapped') await closeUp(hand, row);
    await tx.delete(batch).where(and(eq(batch.seasonId, board.season.id), eq(batch.id, id)));
    return { what: `Deleted ${row.name}`, touches: [id] };
  };

/** A shelf that starts from a batch's cake needs the batch. */
export function demandNoBranch(
  chains: readonly { name: string; start: { kind: string; batchId?: string } }[],
  row: { id: string; name: string },
): void {
  const branch = chains.find(({ start }) => start.kind === 'cake' && start.batchId === row.id);
  if (branch)
    throw problem('in-use', {
      detail: `The shelf ${branch.name} starts from the cake of ${row.name}`,
    });
}
