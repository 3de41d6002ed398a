import type { YeastFacts } from './facts.ts';
import { missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { toTenth } from './rounding.ts';
import type { Say } from './say.ts';

/** Ranges where the yeast has none of its own (Handbook of Brewing, 3rd ed., yeast chapter). */
const USUAL_RANGE = { ale: { min: 15, max: 26 }, lager: { min: 5, max: 15 } } as const;

interface Detail {
  /** How far A and B lie outside the range, °C; negative below it, 0 inside or unknown. */
  outA: number;
  outB: number;
}

/** A or B ferments outside the range of the yeast. */
export const fermentationTemperature: Rule<Detail> = {
  id: 'fermentation-temperature',

  judge({ a, b, yeast, rules }) {
    const range = rangeOf(yeast);
    const outA = outside(a.fermentC, range);
    const outB = outside(b.fermentC, range);
    const detail = { outA: outA ?? 0, outB: outB ?? 0 };
    if (Math.abs(detail.outB) > rules.outOfRangeHold) return hold(detail);
    if (detail.outA !== 0 || detail.outB !== 0) return mind(detail);
    return outA === undefined || outB === undefined
      ? unchecked(together(missingOf(a, 'fermentC'), missingOf(b, 'fermentC')))
      : PASSED;
  },

  describe({ standing, detail: { outA, outB } }, link, say) {
    const { a, b, A, B } = namesOf(link);
    const { min, max, own } = rangeOf(link.yeast);
    const range = `${say.temperature(min)} to ${say.temperature(max)}`;
    const parts = [
      ...(outB === 0 ? [] : [off(B, link.b.fermentC, outB, say)]),
      ...(outA === 0 ? [] : [off(outB === 0 ? A : a, link.a.fermentC, outA, say)]),
    ];
    const which = outA !== 0 && outB !== 0 ? `${a} and ${b}` : outB === 0 ? a : b;
    const far = standing === 'hold' || outA === 0 ? outB : outA;
    return {
      title: far > 0 ? 'Too warm for the yeast' : 'Too cold for the yeast',
      because: `${parts.join(', and ')}; this yeast works at ${range}.`,
      do: `Ferment ${which} at ${range}, or use a yeast that likes the temperature.`,
      measures: [
        ...(outA === 0
          ? []
          : [measure('Earlier beer', toTenth(link.a.fermentC ?? 0), '°C', outA > 0 ? max : min)]),
        ...(outB === 0
          ? []
          : [measure('New beer', toTenth(link.b.fermentC ?? 0), '°C', outB > 0 ? max : min)]),
      ],
      basis: own
        ? 'Own range of the yeast'
        : `Usual range of ${link.yeast.kind} yeast: Handbook of Brewing, 3rd ed.`,
    };
  },
};

function rangeOf({ kind, fermentMinC, fermentMaxC }: YeastFacts) {
  return fermentMinC === undefined || fermentMaxC === undefined
    ? { ...USUAL_RANGE[kind], own: false }
    : { min: fermentMinC, max: fermentMaxC, own: true };
}

function outside(c: number | undefined, { min, max }: { min: number; max: number }) {
  if (c === undefined) return undefined;
  const at = toTenth(c);
  const low = toTenth(min);
  const high = toTenth(max);
  if (at < low) return toTenth(at - low);
  return at > high ? toTenth(at - high) : 0;
}

const off = (name: string, c: number | undefined, out: number, say: Say): string =>
  `${name} ferments at ${say.temperature(c ?? 0)}, ${say.degrees(Math.abs(out))} too ${out > 0 ? 'warm' : 'cold'}`;
