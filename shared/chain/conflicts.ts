import type { Batch } from '../api/batch.ts';
import type { Day } from '../rules/vocabulary.ts';
import { formatDay, weekday } from '../units/day.ts';
import { isPencilled, order, push, type BoardIndex } from './board.ts';
import { isScheduled } from './dates.ts';
import { staysByVessel, type Stay } from './vesselUse.ts';

export type Conflict =
  | {
      kind: 'vessel';
      vesselId: string;
      /** First day on which both beers would be in it. */
      day: Day;
      batchIds: string[];
      text: string;
    }
  | { kind: 'blocked' | 'weekday' | 'crowded'; day: Day; batchIds: string[]; text: string };

/**
 * Where plans collide: two beers in one vessel, brew days that are blocked, no brewing weekday, or
 * over the brews of a day. Only what can still be changed: pencilled batches, from today on.
 * In the order of the days.
 */
export function conflictsOf(index: BoardIndex): Conflict[] {
  return [...vesselConflicts(index), ...dayConflicts(index)].sort(
    (a, b) => order(a.day, b.day) || order(a.kind, b.kind),
  );
}

function vesselConflicts(index: BoardIndex): Conflict[] {
  return [...staysByVessel(index)].flatMap(([vesselId, stays]) => {
    const name = index.vessels.get(vesselId)?.name ?? 'the vessel';
    return overlaps(stays).flatMap(([first, second]): Conflict[] => {
      const open = [first, second].some((stay) => {
        const batch = index.batch(stay.batchId);
        return batch !== undefined && isPencilled(batch) && stay.from >= index.board.today;
      });
      if (!open) return [];
      const text = `${first.name} is still in ${name} on ${formatDay(second.from)}, when ${second.name} is brewed.`;
      const batchIds = [first.batchId, second.batchId];
      return [{ kind: 'vessel', vesselId, day: second.from, batchIds, text }];
    });
  });
}

/** Pairs of stays that share a day; a vessel is free on the day its beer is racked. */
function overlaps(unordered: readonly Stay[]): [Stay, Stay][] {
  const stays = [...unordered].sort((a, b) => order(a.from, b.from) || order(a.batchId, b.batchId));
  return stays.flatMap((first, at) =>
    stays
      .slice(at + 1)
      .filter((second) => first.until !== null && second.from < first.until)
      .map((second): [Stay, Stay] => [first, second]),
  );
}

function dayConflicts(index: BoardIndex): Conflict[] {
  const brews = new Map<Day, Batch[]>();
  for (const batch of index.board.batches)
    if (batch.brewOn !== null && isScheduled(batch)) push(brews, batch.brewOn, batch);
  return [...brews].flatMap(([day, batches]) => onOneDay(index, day, batches));
}

function onOneDay(index: BoardIndex, day: Day, batches: readonly Batch[]): Conflict[] {
  const { season, today } = index.board;
  const planned = batches.filter(isPencilled);
  if (day < today || planned.length === 0) return [];
  const found: Conflict[] = [];
  const add = (kind: 'blocked' | 'weekday' | 'crowded', who: readonly Batch[], text: string) =>
    found.push({ kind, day, batchIds: who.map((batch) => batch.id), text });
  const names = planned.map((batch) => batch.name).join(' and ');
  if (season.blockedDays.includes(day))
    add('blocked', planned, `${formatDay(day)} is blocked: ${names}.`);
  else if (!season.brewWeekdays.includes(weekday(day)))
    add('weekday', planned, `${formatDay(day)} is no brewing day of yours: ${names}.`);
  if (batches.length > season.brewsPerDay)
    add('crowded', batches, crowded(day, batches.length, season.brewsPerDay));
  return found;
}

const crowded = (day: Day, brews: number, most: number): string =>
  `${brews} brews on ${formatDay(day)}; a day takes ${most === 1 ? 'one' : most}.`;
