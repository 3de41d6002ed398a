import type { Day } from '../rules/vocabulary.ts';
import { addDays, daysBetween, weekday } from '../units/day.ts';

/** How far a wished shift gives way to the brew days: to the nearest of each weekday. */
const GIVES = 3;

/**
 * By how many days a season's dates are shifted, all alike, so that the days between two brews stay
 * as they were planned. Of the shifts up to three days from the wished one it is the one that puts
 * the most brew days on the season's weekdays; of equal ones the nearest, then the later.
 * @param brewDays days of the plan that is shifted, `YYYY-MM-DD`.
 * @param wished in days; negative: earlier.
 * @param weekdays ISO, 1 = Monday … 7 = Sunday. None: any day will do.
 */
export function seasonShift(
  brewDays: readonly Day[],
  wished: number,
  weekdays: readonly number[],
): number {
  const fitting = (shift: number) =>
    brewDays.filter((day) => weekdays.includes(weekday(addDays(day, shift)))).length;
  let best = wished;
  for (let off = 1; off <= GIVES; off += 1)
    for (const shift of [wished + off, wished - off])
      if (fitting(shift) > fitting(best)) best = shift;
  return best;
}

/** The shift that moves the first of some brew days onto another day; 0 where there is none. */
export function shiftToStart(brewDays: readonly Day[], startOn: Day): number {
  const [first] = brewDays.toSorted();
  return first === undefined ? 0 : daysBetween(first, startOn);
}
