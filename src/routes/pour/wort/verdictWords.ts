import type { UnitPrefs } from '#shared/api/units.ts';
import type { PourStanding } from '#shared/pour/standing.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { format } from '#shared/units/quantity.ts';
import { lowered } from '../../../app/lowered.ts';
import { timeOf } from '../../../app/zonedTime.ts';
import { inTime } from '../words.ts';

export interface SaidVerdict {
  verdict: Verdict;
  /** "Hold: 2.6 °C too warm". */
  title: string;
  /** The next sentence: when it will be ready, or why not. */
  next: string | null;
}

const TITLES: Record<Verdict, string> = { pour: 'Pour', mind: 'Mind', hold: 'Hold' };

/** The verdict in words, the answer first. */
export function sayVerdict(
  { wort, linkHolds }: PourStanding,
  now: number,
  timeZone: string,
): SaidVerdict {
  const [worst] = wort.findings;
  if (wort.verdict !== 'hold' && linkHolds[0])
    return {
      verdict: 'hold',
      title: `Hold: ${lowered(linkHolds[0].title)}`,
      next: linkHolds[0].because,
    };
  if (!worst) return { verdict: 'pour', title: 'Pour: inside the window', next: null };
  return {
    verdict: wort.verdict,
    title: `${TITLES[wort.verdict]}: ${lowered(worst.title)}`,
    next: readyWords(wort, now, timeZone) ?? worst.because,
  };
}

/** "In the window at about 15:42, in 12 minutes (15:36 to 15:51)." */
export function readyWords(
  { ready, whyNot }: PourStanding['wort'],
  now: number,
  timeZone: string,
): string | null {
  if (!ready) return whyNot;
  const time = (at: number) => timeOf(at, timeZone);
  const span = `${time(ready.earliest)} to ${time(ready.latest)}`;
  if (ready.at <= now)
    return `It should be in the window by now (${span}): stir, and read it again.`;
  return `In the window at about ${time(ready.at)}, ${inTime(ready.at, now)} (${span}).`;
}

/** "With the cake: 24.5 °C." Null where the cake or the reading is unknown. */
export const mixedWords = ({ wort }: PourStanding, units: UnitPrefs): string | null =>
  wort.mixedC === null
    ? null
    : `Together with the cake about ${format('temperature', wort.mixedC, units)}; the first cells meet the wort’s own temperature.`;
