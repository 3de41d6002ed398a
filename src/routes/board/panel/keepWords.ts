import type { Batch } from '#shared/api/batch.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import type { Interval, LinkAnswer } from '#shared/rules/answer.ts';
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

/** Which figures of the cake were measured, so that nobody takes an estimate for a reading. */
export function measuredWords({ cake }: Pick<Batch, 'cake'>, units: UnitPrefs): string {
  const { volumeL, massKg, viability, cellsPerMl } = cake?.measured ?? NOTHING;
  const parts = [
    volumeL === null ? [] : format('volume', volumeL, units),
    massKg === null ? [] : format('mass', massKg, units),
    viability === null ? [] : `${Math.round(viability * 100)} % alive`,
    cellsPerMl === null ? [] : `${Number((cellsPerMl / 1e9).toPrecision(2))} billion cells/mL`,
  ].flat();
  return parts.length === 0
    ? 'All of this is estimated; nothing of the cake was measured.'
    : `Measured: ${parts.join(', ')}. The rest is estimated.`;
}

const NOTHING = { volumeL: null, massKg: null, viability: null, cellsPerMl: null };

/** What may be done with the rest, as the advice on this link has it. */
export const surplusWords = ({ advice }: LinkAnswer): string | undefined =>
  advice.find(({ id }) => id === 'jar-the-rest')?.text;

/** The trade's rule of thumb by weight beside ours, and why the two differ. */
export function thumbWords({ keep }: LinkAnswer, units: UnitPrefs): string | null {
  const { thumbKg, recommendedKg } = keep;
  if (!thumbKg) return null;
  const range = `${format('mass', thumbKg.low, units)} to ${format('mass', thumbKg.high, units)}`;
  const thumb = `The trade's rule of thumb by weight is ${range} of slurry (common practice).`;
  if (recommendedKg === null) return thumb;
  return `${thumb} Ours is ${format('mass', recommendedKg, units)}: it meets the need even at the low end of the estimate.`;
}

/** "1.05–2.94 L": the two ends of an interval, with the unit once where both share it. */
export function spanWords({ low, high }: Pick<Interval, 'low' | 'high'>, units: UnitPrefs): string {
  const from = format('smallVolume', low, units);
  const to = format('smallVolume', high, units);
  const unit = to.slice(to.lastIndexOf(' '));
  return `${from.endsWith(unit) ? from.slice(0, -unit.length) : from}–${to}`;
}
