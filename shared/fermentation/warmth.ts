import type { Say } from '../rules/say.ts';
import type { YeastKind } from '../rules/vocabulary.ts';
import { tenThousandths } from './digest.ts';
import type { Notice, Watched } from './seen.ts';

/** Where the yeast has no range of its own (Handbook of Brewing, 3rd ed., yeast chapter). */
const USUAL: Record<YeastKind, { min: number; max: number }> = {
  ale: { min: 15, max: 26 },
  lager: { min: 5, max: 15 },
};
/** So near its end a beer may be cooled (common practice). */
export const NEAR_END_SG = 0.003;

export interface Range {
  min: number;
  max: number;
  own: boolean;
}

/** °C in which this yeast ferments. */
export const rangeOf = ({
  kind,
  fermentMinC: min,
  fermentMaxC: max,
}: Pick<Watched, 'kind' | 'fermentMinC' | 'fermentMaxC'>): Range =>
  min === null || max === null ? { ...USUAL[kind], own: false } : { min, max, own: true };

const toTenth = (c: number) => Math.round(c * 10) / 10;

/** The newest temperature lies outside the yeast's range. A beer that is done may be cold. */
export function warmthNotice(watched: Watched, say: Say): Notice | null {
  const { temperatureC } = watched.followed;
  if (temperatureC === null) return null;
  const { min, max, own } = rangeOf(watched);
  const at = toTenth(temperatureC);
  const [low, high] = [toTenth(min), toTenth(max)];
  const isCold = at < low && !isDone(watched);
  if (!isCold && at <= high) return null;
  return {
    id: 'temperature',
    title: isCold ? 'Too cold for the yeast' : 'Too warm for the yeast',
    because: `It was last read at ${say.temperature(temperatureC)}; this yeast works at ${say.temperature(min)} to ${say.temperature(max)}.`,
    do: isCold
      ? 'Bring it up slowly, a degree or two a day; a cold shock sends the yeast to sleep.'
      : 'Cool it slowly. Heat makes harsh alcohols and wears the yeast for the next beer.',
    basis: own
      ? 'Own range of the yeast'
      : `Usual range of ${watched.kind} yeast: Handbook of Brewing, 3rd ed.`,
  };
}

const isDone = ({ followed: { gravity }, expectedFg }: Watched): boolean =>
  gravity !== null &&
  expectedFg !== null &&
  tenThousandths(gravity) - tenThousandths(expectedFg) <= tenThousandths(NEAR_END_SG);
