import { randomUUID } from 'node:crypto';
import type { Batch } from '#shared/api/batch.ts';
import type { SeasonCopy, SeasonCreate } from '#shared/api/brewery.ts';
import type { ChainStart } from '#shared/api/chain.ts';
import { copiedSeason, type CopiedShelf } from '#shared/chain/seasonCopy.ts';
import { batch, chain } from '../../db/schema/chain.ts';
import { yeastLine } from '../../db/schema/stock.ts';
import { invalidField } from '../../problems.ts';
import { linkColumns } from '../batches/rows.ts';
import type { Writer } from '../board/hand.ts';
import type { BoardRows } from '../board/load.ts';
import { startColumns } from '../chains/present.ts';

/** Writes the plan of one season into another, which is new and empty. */
export async function copyInto(
  making: Writer,
  from: BoardRows,
  copy: SeasonCopy,
  { brewWeekdays }: Pick<SeasonCreate, 'brewWeekdays'>,
): Promise<{ chains: number; batches: number }> {
  if (!copy.chainIds.every((id) => from.chains.some((each) => each.id === id)))
    throw invalidField('/copy/chainIds', 'Choose shelves of the season that is copied');
  const { shelves, bench } = copiedSeason(from, copy, brewWeekdays);
  const copies = new Copies();
  for (const shelf of shelves) await insertShelf(making, copies, shelf);
  await insertBatches(making, copies, bench, null);
  return { chains: shelves.length, batches: copies.batchCount };
}

/** The new ids of what was copied so far, and the line of the yeast that each batch hands on. */
class Copies {
  readonly #batches = new Map<string, { id: string; lineId: string | null }>();
  position = 0;

  get batchCount(): number {
    return this.#batches.size;
  }

  add(oldId: string, lineId: string | null): string {
    const id = randomUUID();
    this.#batches.set(oldId, { id, lineId });
    return id;
  }

  of(start: ChainStart) {
    return start.kind === 'cake' ? this.#batches.get(start.batchId) : undefined;
  }
}

async function insertShelf(
  making: Writer,
  copies: Copies,
  { chain: old, batches }: CopiedShelf,
): Promise<void> {
  const { tx, member } = making;
  const id = randomUUID();
  const source = copies.of(old.start);
  const lineId = source?.lineId ?? id;
  const { name, yeastId, vesselId } = old;
  if (lineId === id)
    await tx.insert(yeastLine).values({ id, yeastId, breweryId: member.brewery.id });
  await tx.insert(chain).values({
    id,
    name,
    yeastId,
    vesselId,
    lineId,
    position: copies.position,
    ...startColumns(source ? { kind: 'cake', batchId: source.id } : old.start),
    breweryId: member.brewery.id,
    seasonId: member.seasonId,
  });
  copies.position += 1;
  await insertBatches(making, copies, batches, { id, lineId });
}

async function insertBatches(
  { tx, member, now }: Writer,
  copies: Copies,
  batches: readonly Batch[],
  shelf: { id: string; lineId: string } | null,
): Promise<void> {
  if (batches.length === 0) return;
  await tx.insert(batch).values(
    batches.map((each, place) => ({
      ...planColumns(each),
      id: copies.add(each.id, shelf?.lineId ?? null),
      chainId: shelf?.id ?? null,
      place,
      breweryId: member.brewery.id,
      seasonId: member.seasonId,
      createdAt: now,
    })),
  );
}

/** What a person wrote of the plan, with what they typed for it. */
const planColumns = (row: Batch) => ({
  ...linkColumns(row.link),
  name: row.name,
  style: row.style,
  volumeL: row.volumeL,
  og: row.og,
  fg: row.fg,
  srm: row.srm,
  ibu: row.ibu,
  fermentC: row.fermentC,
  daysUnderBeer: row.daysUnderBeer,
  brewOn: row.brewOn,
  wantedOn: row.wantedOn,
  dryHops: row.dryHops,
  additions: row.additions,
  allergens: row.allergens,
  cultures: row.cultures,
  trub: row.trub,
  vesselId: row.vesselId,
  yeastId: row.yeastId,
  notes: row.notes,
  typed: row.typed,
});
