import type { Sight } from './boardLink.ts';
import type { Draft } from './draft.ts';
import { stayOf, useOfVessel, vesselIdOf, type Stay, type VesselUse } from './vesselUse.ts';

/** What changes of the vessels' use in a draft: by batch, only where it differs from the board. */
export function revisedUses(
  { index, stays, use }: Pick<Sight, 'index' | 'stays' | 'use'>,
  draft: Draft,
): Map<string, VesselUse> {
  const revised = new Map<string, VesselUse>();
  for (const [vesselId, news] of changedStays(index, draft)) {
    const kept = (stays.get(vesselId) ?? []).filter((stay) => !news.gone.has(stay.batchId));
    const cleanedOn = index.vessels.get(vesselId)?.cleanedOn ?? null;
    for (const [id, now] of useOfVessel([...kept, ...news.come], cleanedOn)) {
      const before = use(id);
      const same =
        (before?.takenBy === undefined) === (now.takenBy === undefined) &&
        before?.beersSinceCleaning === now.beersSinceCleaning;
      if (!same) revised.set(id, now);
    }
  }
  return revised;
}

/** By vessel: stays that go or change, and stays that come or have changed. */
function changedStays(index: Sight['index'], draft: Draft) {
  const changed = new Map<string, { gone: Set<string>; come: Stay[] }>();
  const at = (vesselId: string) => {
    const entry = changed.get(vesselId) ?? { gone: new Set<string>(), come: [] };
    changed.set(vesselId, entry);
    return entry;
  };
  for (const row of draft.rows.values()) {
    const was = index.batch(row.id);
    if (!was || (was.brewOn === row.brewOn && was.chainId === row.chainId)) continue;
    const before = vesselIdOf(was, index);
    const after = vesselIdOf(row, draft);
    const stay = stayOf(row);
    if (before !== null) at(before).gone.add(row.id);
    if (after !== null && stay) at(after).come.push(stay);
  }
  return changed;
}
