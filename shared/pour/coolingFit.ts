/**
 * Newton's law of cooling, T(t) = S + (T0 − S) e^(−kt), fitted to readings: S is what the wort cools
 * towards, k the rate. The question is one number, the time at which T meets a target, so that the
 * curve is written by it: T(t) = S + (target − S) e^(−k(t − meets)). For a given time and rate only S
 * is left, and the sum of squares has its least value in closed form.
 *
 * The interval is that of the likelihood ratio (Wilks 1938): every time at which the best curve is
 * worse than the best of all by no more than the 90 % point of chi-square with one degree of freedom.
 * It widens by itself where few readings leave S open, which a tangent at the best fit would not.
 */
export interface Point {
  /** Minutes. */
  t: number;
  c: number;
}

/** Error of one reading, °C: one standard deviation. */
export const READING_ERROR_C = 0.3;
const CHI_SQUARE_90 = 2.7055;
/** Rates of cooling from a vessel of tonnes in still air to a plate chiller, per minute. */
const SLOWEST = Math.log(1 / 10_000);
const FASTEST = Math.log(1 / 2);
const RATES = 24;
const GOLDEN = (Math.sqrt(5) - 1) / 2;
/** How far ahead a forecast reaches, minutes. */
export const HORIZON = 48 * 60;

/** What the wort cools towards lies between these, °C. */
export interface Towards {
  low: number;
  high: number;
}

interface Least {
  x: number;
  value: number;
}

/** The least value of a function with one valley in a range, to `width`. */
function golden(f: (x: number) => number, from: number, to: number, width: number): Least {
  let [a, b] = [from, to];
  let x1 = b - GOLDEN * (b - a);
  let x2 = a + GOLDEN * (b - a);
  let [f1, f2] = [f(x1), f(x2)];
  while (b - a > width) {
    if (f1 < f2) {
      [b, x2, f2] = [x2, x1, f1];
      x1 = b - GOLDEN * (b - a);
      f1 = f(x1);
    } else {
      [a, x1, f1] = [x1, x2, f2];
      x2 = a + GOLDEN * (b - a);
      f2 = f(x2);
    }
  }
  return f1 < f2 ? { x: x1, value: f1 } : { x: x2, value: f2 };
}

/** The least over the rate, which may have more than one valley: looked for on a grid first. */
function leastOverRates(f: (logRate: number) => number): Least {
  const step = (FASTEST - SLOWEST) / RATES;
  let best: Least = { x: SLOWEST, value: Number.POSITIVE_INFINITY };
  for (let n = 0; n <= RATES; n += 1) {
    const value = f(SLOWEST + n * step);
    if (value < best.value) best = { x: SLOWEST + n * step, value };
  }
  const fine = golden(f, Math.max(SLOWEST, best.x - step), Math.min(FASTEST, best.x + step), 0.005);
  return fine.value < best.value ? fine : best;
}

/** Misfit of the best curve of this rate that meets the target then, and what it cools towards. */
function curveThrough(points: readonly Point[], target: number, meets: number, rate: number) {
  return (towards: Towards) => {
    let [xx, xy, yy] = [0, 0, 0];
    for (const { t, c } of points) {
      const left = Math.exp(-rate * (t - meets));
      const x = 1 - left;
      const y = c - target * left;
      xx += x * x;
      xy += x * y;
      yy += y * y;
    }
    const free = xx === 0 ? towards.low : xy / xx;
    const s = Math.min(towards.high, Math.max(towards.low, free));
    return { s, misfit: (yy - 2 * s * xy + s * s * xx) / READING_ERROR_C ** 2 };
  };
}

function misfitAt(
  points: readonly Point[],
  target: number,
  meets: number,
  towards: Towards,
): Least {
  return leastOverRates(
    (logRate) => curveThrough(points, target, meets, Math.exp(logRate))(towards).misfit,
  );
}

/** The best curve of all, wherever it leads: for each rate a straight line in e^(−kt). */
export function bestCurve(points: readonly Point[], towards: Towards) {
  const first = points[0]?.t ?? 0;
  const at = (logRate: number) => lineIn(points, first, Math.exp(logRate), towards);
  const least = leastOverRates((logRate) => at(logRate).misfit);
  const { s, over, misfit } = at(least.x);
  return { s, over, rate: Math.exp(least.x), from: first, misfit };
}
export type Curve = ReturnType<typeof bestCurve>;

/** Temperature of a curve, °C, at a minute. */
export const onCurve = ({ s, over, rate, from }: Curve, t: number): number =>
  s + over * Math.exp(-rate * (t - from));

function lineIn(points: readonly Point[], first: number, rate: number, towards: Towards) {
  let [n, x, y, xx, xy, yy] = [0, 0, 0, 0, 0, 0];
  for (const { t, c } of points) {
    const e = Math.exp(-rate * (t - first));
    n += 1;
    x += e;
    y += c;
    xx += e * e;
    xy += e * c;
    yy += c * c;
  }
  const spread = n * xx - x * x;
  const free = spread > 1e-12 ? (y * xx - x * xy) / spread : y / n;
  const s = Math.min(towards.high, Math.max(towards.low, free));
  const over = (xy - s * x) / xx;
  const squares = yy - 2 * s * y - 2 * over * xy + n * s * s + 2 * s * over * x + over * over * xx;
  return { s, over, misfit: squares / READING_ERROR_C ** 2 };
}

export interface Meeting {
  likely: number;
  low: number;
  /** Null: a curve that never meets the target within the horizon fits as well. */
  high: number | null;
  misfit: number;
}

/**
 * When the wort meets the target, in minutes on the readings' own scale, with the 90 % interval.
 * Readings are in order of time and lie above the target's far side; two readings fix no `towards`
 * of their own, so give them one of no width.
 */
export function meeting(points: readonly Point[], target: number, towards: Towards): Meeting {
  const first = points[0]?.t ?? 0;
  const f = (after: number) => misfitAt(points, target, first + Math.exp(after), towards).value;
  // Times are searched by their logarithm: a minute matters at first, not on the second day.
  const [from, to] = [Math.log(0.5), Math.log(HORIZON)];
  const steps = 16;
  const width = (to - from) / steps;
  let best: Least = { x: from, value: Number.POSITIVE_INFINITY };
  for (let n = 0; n <= steps; n += 1) {
    const value = f(from + n * width);
    if (value < best.value) best = { x: from + n * width, value };
  }
  const fine = golden(f, Math.max(from, best.x - width), Math.min(to, best.x + width), 0.002);
  if (fine.value < best.value) best = fine;
  const limit = best.value + CHI_SQUARE_90;
  const low = edge(f, limit, best.x, from);
  const high = edge(f, limit, best.x, to);
  return {
    likely: first + Math.exp(best.x),
    low: first + (low === null ? 0 : Math.exp(low)),
    high: high === null ? null : first + Math.exp(high),
    misfit: best.value,
  };
}

/** Where the misfit passes its limit between the best time and an end; null: not before that end. */
function edge(f: (x: number) => number, limit: number, best: number, end: number): number | null {
  if (f(end) <= limit) return null;
  let [inside, outside] = [best, end];
  while (Math.abs(outside - inside) > 0.002) {
    const middle = (inside + outside) / 2;
    if (f(middle) <= limit) inside = middle;
    else outside = middle;
  }
  return (inside + outside) / 2;
}
