import type { Batch } from '../api/batch.ts';
import { noticesOf, watchedOf } from '../fermentation/notices.ts';
import { isStuck } from '../fermentation/stuck.ts';
import type { UnitPrefs } from '../api/units.ts';
import type { BoardContext } from '../rules/facts.ts';
import { sayIn } from '../rules/say.ts';
import { daysBetween } from '../units/day.ts';
import { DEFAULT_UNITS } from '../units/quantity.ts';
import type { BoardIndex } from './board.ts';

/** A pour that is due today, tomorrow, or was due: its cake wants judging. */
const DUE_DAYS = 1;

/**
 * What is known of the cake beyond its plan: how it was judged, what was counted, and what the
 * readings of its beer warn of. Null where the beer is not brewed yet.
 */
export function cakeCheckOf(
  earlier: Batch,
  later: Batch,
  { index, units }: { index: BoardIndex; units: UnitPrefs | undefined },
): BoardContext['cakeCheck'] | null {
  const { cake, chainId } = earlier;
  if (cake === null) return null;
  const check: NonNullable<BoardContext['cakeCheck']> = {
    dueWithinADay: isDue(later, index.board.today),
  };
  const living = cake.measured?.viability ?? null;
  if (living !== null) check.dead = 1 - living;
  if (cake.check) {
    check.judged = cake.check.judged;
    check.tastedOff = cake.check.tasted === 'off';
  }
  const yeast = index.yeasts.get(index.chain(chainId ?? '')?.yeastId ?? '');
  const watched = yeast ? watchedOf(earlier, yeast) : null;
  if (!watched) return check;
  check.fermentationStuck = isStuck(watched);
  check.noticed = noticesOf(watched, sayIn(units ?? DEFAULT_UNITS)).map(({ because }) => because);
  return check;
}

const isDue = ({ stage, brewOn }: Batch, today: string): boolean =>
  stage === 'pencilled' && brewOn !== null && daysBetween(today, brewOn) <= DUE_DAYS;
