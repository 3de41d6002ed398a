import type { Batch, Link } from '#shared/api/batch.ts';
import type { batch } from '../../db/schema/chain.ts';
import type { cake, cakeCheck } from '../../db/schema/cake.ts';

/** A batch's columns that anybody sees. */
export type BatchRow = Omit<
  typeof batch.$inferSelect,
  'breweryId' | 'seasonId' | 'shelfId' | 'createdAt'
>;
export type CakeRow = typeof cake.$inferSelect;
/** Of a cake's judgement what its batch says. */
export type CheckSaid = Pick<typeof cakeCheck.$inferSelect, 'judged' | 'tasted'>;

/** The one place where a batch's rows become its contract. */
export function presentBatch(
  row: BatchRow,
  itsCake: CakeRow | null,
  check: CheckSaid | null,
): Batch {
  return {
    id: row.id,
    version: row.version,
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
    chainId: row.chainId,
    place: row.place ?? 0,
    stage: row.stage,
    scrapReason: row.scrapReason,
    read: {
      volumeL: row.readVolumeL,
      og: row.readOg,
      fg: row.readFg,
      rackedOn: row.rackedOn,
    },
    followed: row.followed,
    cake: itsCake && { state: itsCake.state, check, measured: itsCake.measured },
    link: presentLink(row),
  };
}

function presentLink(row: BatchRow): Link {
  return {
    takenOn: row.takenOn,
    keepL: row.keepL,
    keepWhole: row.keepWhole,
    leftAboveL: row.leftAboveL,
    cakeC: row.cakeC,
    starter: row.starter,
    typed: row.linkTyped,
    acceptance: row.acceptance,
  };
}
