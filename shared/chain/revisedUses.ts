import type { Batch } from '../api/batch.ts';
import type { Sight } from './boardLink.ts';
import { isScheduled } from './dates.ts';
import type { Draft } from './draft.ts';
import { stayOf, useOfVessel, vesselIdOf, type Stay, type VesselUse } from './vesselUse.ts';

interface Change {
  /** Batches whose stay ends or changes. */
  gone: Set<string>;
  /** Stays that come, or as they are changed. */
  come: Stay[];
  key: string;
}

/** What drafts of one board change of the use of its vessels. The same change is met once. */
export class RevisedUses {
  readonly #base: Sight;
  readonly #known = new Map<string, ReadonlyMap<string, VesselUse>>();

  constructor(base: Sight) {
    this.#base = base;
  }

  /** By batch, only where the draft differs from the board. */
  in(draft: Draft): ReadonlyMap<string, VesselUse> {
    const revised = new Map<string, VesselUse>();
    for (const row of draft.rows.values())
      if (this.#base.use(row.id) && !isInVessel(row, draft)) revised.set(row.id, NO_VESSEL);
    for (const [vesselId, change] of this.#changes(draft))
      for (const [id, use] of this.#revised(vesselId, change)) revised.set(id, use);
    return revised;
  }

  #changes(draft: Draft): Map<string, Change> {
    const changes = new Map<string, Change>();
    for (const row of draft.rows.values()) {
      const was = this.#base.index.batch(row.id);
      if (!was || (was.brewOn === row.brewOn && was.chainId === row.chainId)) continue;
      this.#add(changes, was, row, draft);
    }
    return changes;
  }

  #add(changes: Map<string, Change>, was: Batch, row: Batch, draft: Draft): void {
    const at = (vesselId: string): Change => {
      const known = changes.get(vesselId) ?? { gone: new Set(), come: [], key: vesselId };
      changes.set(vesselId, known);
      return known;
    };
    const before = vesselIdOf(was, this.#base.index);
    const after = vesselIdOf(row, draft);
    if (before !== null) {
      const change = at(before);
      change.gone.add(row.id);
      change.key += `-${row.id}`;
    }
    const stay = after === null ? null : stayOf(row);
    if (after !== null && stay) {
      const change = at(after);
      change.come.push(stay);
      change.key += `+${row.id}${stay.from}`;
    }
  }

  #revised(vesselId: string, change: Change): ReadonlyMap<string, VesselUse> {
    const known = this.#known.get(change.key);
    if (known) return known;
    const { index, stays, use } = this.#base;
    const kept = (stays.get(vesselId) ?? []).filter((stay) => !change.gone.has(stay.batchId));
    const cleanedOn = index.vessels.get(vesselId)?.cleanedOn ?? null;
    const uses = useOfVessel([...kept, ...change.come], cleanedOn);
    for (const [id, now] of uses) if (isSame(use(id), now)) uses.delete(id);
    this.#known.set(change.key, uses);
    return uses;
  }
}

/** A batch that would be in no vessel, or without a day, finds nothing there. */
const NO_VESSEL: VesselUse = { takenBy: undefined, beersSinceCleaning: undefined };

const isInVessel = (row: Batch, draft: Draft): boolean =>
  vesselIdOf(row, draft) !== null && row.brewOn !== null && isScheduled(row);

const isSame = (was: VesselUse | undefined, now: VesselUse): boolean =>
  (was?.takenBy === undefined) === (now.takenBy === undefined) &&
  was?.beersSinceCleaning === now.beersSinceCleaning;
