import type { Batch } from '../api/batch.ts';
import { rackDay } from '../chain/dates.ts';
import type { Day } from '../rules/vocabulary.ts';
import { addDays } from '../units/day.ts';
import type { Duty } from './duty.ts';
import { successorsOf, type Sight } from './sight.ts';

/** Where no day is planned: so long before racking. Common practice; two to five days are usual. */
export const HOP_DAYS = 3;

/**
 * Dry hops of a fermenting batch, and the taking of its yeast where that is planned apart from
 * racking. Where the hops are to go in after the yeast is taken, and another batch waits for it, the
 * yeast comes first, on the same day at the latest.
 */
export function hopDuties(batch: Batch, sight: Sight): Duty[] {
  const takings = takeYeast(batch, sight);
  const hops = dryHop(batch, sight);
  const earliest = hops?.day;
  return [
    ...takings.map((one) =>
      earliest !== undefined && hops?.yeastFirst && one.day > earliest
        ? { ...one, day: earliest }
        : one,
    ),
    ...(hops ? [hops] : []),
  ];
}

const isDone = (batch: Batch, { facts }: Sight, kind: 'dry-hop' | 'yeast-taken'): boolean =>
  facts.events.some((event) => event.batchId === batch.id && event.kind === kind && event.isDone);

function planned(batch: Batch, { facts }: Sight, kind: 'dry-hop' | 'yeast-taken'): Day | null {
  const days = facts.events.flatMap((event) =>
    event.batchId === batch.id && event.kind === kind && !event.isDone && event.plannedOn !== null
      ? [event.plannedOn]
      : [],
  );
  return days.toSorted()[0] ?? null;
}

function takeYeast(batch: Batch, sight: Sight): (Duty & { kind: 'take-yeast' })[] {
  if (isDone(batch, sight, 'yeast-taken')) return [];
  const day = planned(batch, sight, 'yeast-taken');
  return successorsOf(batch, sight.index).flatMap(({ id, link }) => {
    const on = link.takenOn ?? day;
    if (on === null || on === rackDay(batch)) return [];
    return [
      {
        kind: 'take-yeast' as const,
        key: `take ${batch.id} ${id}`,
        batchId: batch.id,
        day: on,
        forId: id,
      },
    ];
  });
}

function dryHop(batch: Batch, sight: Sight): (Duty & { kind: 'dry-hop' }) | null {
  const hops = (batch.dryHops ?? []).filter(({ gramsPerLitre }) => gramsPerLitre > 0);
  const day = planned(batch, sight, 'dry-hop');
  if ((hops.length === 0 && day === null) || isDone(batch, sight, 'dry-hop')) return null;
  const racked = rackDay(batch);
  const usual = racked === null ? null : addDays(racked, -HOP_DAYS);
  const on = day ?? usual;
  if (on === null) return null;
  const waits = successorsOf(batch, sight.index)[0];
  const isAfter = hops.some(({ timing }) => timing === 'after-taking');
  const yeastFirst = isAfter && waits && !isDone(batch, sight, 'yeast-taken') ? waits.id : null;
  return {
    kind: 'dry-hop',
    key: `hops ${batch.id}`,
    batchId: batch.id,
    day: on,
    gramsPerLitre: hops.reduce((sum, hop) => sum + hop.gramsPerLitre, 0),
    yeastFirst,
    isUsualDay: day === null,
  };
}
