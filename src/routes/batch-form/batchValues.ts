import type { Batch } from '#shared/api/batch.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { newId } from '../../app/newId.ts';
import { written } from '../../components/form/written.ts';

/** Most home batches; said as the default only until a brewery has brewed. */
const USUAL_VOLUME_L = 23;

export type Known = 'none' | 'some' | 'unknown';
const knownOf = (list: readonly unknown[] | null): Known =>
  list === null ? 'unknown' : list.length === 0 ? 'none' : 'some';

export interface NewDefaults {
  volumeL: number | null;
}

/** What the fields of a batch show at first; a copy gets an id of its own and no dates. */
export function batchValues(
  mode: 'new' | 'edit' | 'duplicate',
  batch: Batch | null,
  units: UnitPrefs,
  defaults: NewDefaults,
) {
  const typed = batch?.typed ?? {};
  const isCopy = mode === 'duplicate';
  const dryHops = batch ? batch.dryHops : [];
  const additions = batch ? batch.additions : [];
  const volumeL = batch ? batch.volumeL : (defaults.volumeL ?? USUAL_VOLUME_L);
  return {
    id: mode === 'edit' && batch ? batch.id : newId(),
    name: batch ? (isCopy ? `${batch.name} again`.slice(0, 60) : batch.name) : '',
    style: batch?.style ?? '',
    volumeL: written('volume', volumeL, units, typed.volumeL),
    og: written('gravity', batch?.og ?? null, units, typed.og),
    fg: written('gravity', batch?.fg ?? null, units, typed.fg),
    srm: written('colour', batch?.srm ?? null, units, typed.srm),
    ibu: written('bitterness', batch?.ibu ?? null, units, typed.ibu),
    fermentC: written('temperature', batch?.fermentC ?? null, units, typed.fermentC),
    daysUnderBeer: written('days', batch?.daysUnderBeer ?? null, units, typed.daysUnderBeer),
    brewOn: isCopy ? null : (batch?.brewOn ?? null),
    wantedOn: isCopy ? null : (batch?.wantedOn ?? null),
    dryHopsKnown: knownOf(dryHops),
    dryHops: (dryHops ?? []).map((hop, i) => ({
      ...hop,
      gramsPerLitre: written(
        'hopRate',
        hop.gramsPerLitre,
        units,
        typed[`dryHops.${i}.gramsPerLitre`],
      ),
    })),
    additionsKnown: knownOf(additions),
    additions: additions ?? [],
    // Barley and wheat are in nearly every beer.
    allergens: batch ? batch.allergens : ['gluten'],
    cultures: batch ? batch.cultures : [],
    trub: batch?.trub ?? 'some',
    vesselId: batch?.vesselId ?? null,
    yeastId: batch?.yeastId ?? null,
    notes: batch?.notes ?? '',
  };
}

export type BatchValues = ReturnType<typeof batchValues>;

/** "None", "these" or "not known" and the lists become the one list of the contract. */
export function batchShape(body: Record<string, unknown>): Record<string, unknown> {
  const { dryHopsKnown, additionsKnown, ...rest } = body;
  const listOf = (known: unknown, list: unknown) =>
    known === 'unknown' ? null : known === 'none' ? [] : list;
  return {
    ...rest,
    dryHops: listOf(dryHopsKnown, rest.dryHops),
    additions: listOf(additionsKnown, rest.additions),
  };
}
