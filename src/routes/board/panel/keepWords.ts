import type { UnitPrefs } from '#shared/api/units.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import { format } from '#shared/units/quantity.ts';

const times = (n: number): string => (n >= 10 ? n.toFixed(0) : String(Number(n.toFixed(1))));

/** How the kept part and the whole cake compare with what the wort needs. */
export function enoughWords({ cake, need, keep }: LinkAnswer): string {
  const parts: string[] = [];
  if (cake.viableCells && need.viableCells) {
    const whole = cake.viableCells.likely / need.viableCells;
    parts.push(`The whole cake has ${times(whole)} × the cells this wort needs`);
  }
  if (keep.ratio !== null) parts.push(`what is kept has ${times(keep.ratio)} ×`);
  return parts.length > 0 ? `${parts.join('; ')}.` : '';
}

/** What is left over and may go into a jar; null where all is kept. */
export function surplusWords({ cake, keep }: LinkAnswer, units: UnitPrefs): string | null {
  if (cake.volumeL === null || keep.keptL === null) return null;
  const rest = cake.volumeL - keep.keptL;
  if (rest < 0.05) return null;
  return `Jar the rest, about ${format('smallVolume', rest, units)}: lid loose, kept cold, opened cold with the eyes covered.`;
}

/** The trade's rule of thumb by weight beside ours, and why the two differ. */
export function thumbWords({ keep }: LinkAnswer, units: UnitPrefs): string | null {
  const { thumbKg, recommendedKg } = keep;
  if (!thumbKg) return null;
  const range = `${format('mass', thumbKg.low, units)} to ${format('mass', thumbKg.high, units)}`;
  const thumb = `The trade's rule of thumb by weight is ${range} of slurry (common practice).`;
  if (recommendedKg === null) return thumb;
  return `${thumb} Ours is ${format('mass', recommendedKg, units)}: it meets the need even at the low end of the estimate.`;
}
