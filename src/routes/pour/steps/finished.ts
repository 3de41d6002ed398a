import type { Batch } from '#shared/api/batch.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { format } from '#shared/units/quantity.ts';

const HOURS_48 = 48 * 60 * 60 * 1000;
/** Points of gravity above the expected final that are still near it. */
const NEAR = 0.003;

export interface Finished {
  done: boolean;
  /** One sentence with the numbers. */
  because: string;
}

/**
 * Whether a beer is finished: two readings at least 48 hours apart within 0.001, near the expected
 * final gravity (common practice).
 */
export function finishedOf({ followed, fg, read }: Batch, units: UnitPrefs): Finished {
  const expected = fg === null ? '' : `, expected ${format('gravity', fg, units)}`;
  if (read.fg !== null)
    return { done: true, because: `Racked at ${format('gravity', read.fg, units)}${expected}.` };
  if (!followed || followed.gravity === null || followed.gravityAt === null)
    return { done: false, because: `No gravity was read yet${expected}.` };
  const last = format('gravity', followed.gravity, units);
  const steady =
    followed.steadyFrom !== null &&
    Date.parse(followed.gravityAt) - Date.parse(followed.steadyFrom) >= HOURS_48;
  if (!steady)
    return {
      done: false,
      because: `Last read ${last}${expected}: no two readings 48 hours apart agree yet.`,
    };
  if (fg !== null && followed.gravity > fg + NEAR)
    return {
      done: false,
      because: `It stays at ${last}, well above the ${format('gravity', fg, units)} expected: it may be stuck.`,
    };
  return { done: true, because: `It stays at ${last} for 48 hours and more${expected}.` };
}
