import type { Measure } from '../rules/answer.ts';
import type { YeastFacts } from '../rules/facts.ts';
import { measure } from '../rules/outcome.ts';
import type { HouseRules } from '../rules/resolve.ts';
import { toTenth } from '../rules/rounding.ts';
import { atMost, SAY_DEFAULT, type Say } from '../rules/say.ts';
import type { Verdict } from '../rules/vocabulary.ts';
import { forecast, type Forecast, type Reading } from './forecast.ts';
import { mixedTemperature, type PourCake, type Wort } from './mixing.ts';
import { NEVER_OVERRIDDEN, type PourRule } from './vocabulary.ts';
import { neverAbove, pourWindow, type PourWindow } from './window.ts';

/** What the pour check is told. Absent is unknown. */
export interface PourCheck {
  yeast: Pick<YeastFacts, 'kind' | 'pourMinC' | 'pourMaxC' | 'neverAboveC'>;
  /** The moment that is judged, milliseconds since 1970. */
  at: number;
  /** In any order, none later than `at`. */
  readings: readonly Reading[];
  wort?: Wort | undefined;
  cake?: { volumeL?: number | undefined; c?: number | undefined } | undefined;
  /** Temperature of the cooling water, or of the room, °C. */
  coolantC?: number | undefined;
  rules: HouseRules;
}

export interface PourFinding {
  rule: PourRule;
  verdict: 'mind' | 'hold';
  title: string;
  because: string;
  do: string;
  measures: Measure[];
  basis: string;
}

export interface PourAnswer extends Forecast {
  verdict: Verdict;
  /** Worst first. */
  findings: PourFinding[];
  window: PourWindow;
  /** The latest reading, °C, however old. */
  readingC: number | null;
  /** When it was taken. */
  readAt: number | null;
  /** Wort and cake together, °C; null where the cake, the wort or the reading is unknown. */
  mixedC: number | null;
  /** A hold that a head brewer may override with a written reason. */
  overridable: boolean;
}

const MINUTE = 60_000;

/** May the wort go onto the cake now? */
export function checkPour(check: PourCheck, say: Say = SAY_DEFAULT): PourAnswer {
  const window = pourWindow(check.yeast);
  const last = latest(check.readings);
  const findings = findingsOf(check, window, last, say);
  const holds = findings.filter((one) => one.verdict === 'hold');
  const { readings, coolantC } = check;
  return {
    verdict: holds.length > 0 ? 'hold' : findings.length > 0 ? 'mind' : 'pour',
    findings,
    window,
    readingC: last?.c ?? null,
    readAt: last?.at ?? null,
    mixedC: mixed(check, last),
    overridable: holds.length > 0 && !holds.some((one) => NEVER_OVERRIDDEN.includes(one.rule)),
    ...forecast({ readings, window, coolantC }, say),
  };
}

/** Of readings at one instant, the one that was given last. */
const latest = (readings: readonly Reading[]): Reading | undefined =>
  readings.reduce<Reading | undefined>(
    (last, one) => (last === undefined || one.at >= last.at ? one : last),
    undefined,
  );

function mixed({ wort, cake }: PourCheck, last: Reading | undefined): number | null {
  if (!wort || !last || cake?.c === undefined || cake.volumeL === undefined) return null;
  const known: PourCake = { volumeL: cake.volumeL, c: cake.c };
  return mixedTemperature(wort, last.c, known);
}

function findingsOf(
  check: PourCheck,
  window: PourWindow,
  last: Reading | undefined,
  say: Say,
): PourFinding[] {
  const minutes = check.rules.readingMinutes;
  if (!last || check.at - last.at > minutes * MINUTE) return [noReading(check.at, last, minutes)];
  const c = toTenth(last.c);
  const found = [
    killing(c, check, say),
    tooWarm(c, check, window, say),
    tooCold(c, check, window, say),
    warmerCake(c, check, say),
  ].filter((one) => one !== null);
  return [
    ...found.filter((one) => one.verdict === 'hold'),
    ...found.filter((one) => one.verdict === 'mind'),
  ];
}

function noReading(at: number, last: Reading | undefined, minutes: number): PourFinding {
  const age = last ? Math.floor((at - last.at) / MINUTE) : null;
  return {
    rule: 'no-reading',
    verdict: 'hold',
    title: age === null ? 'No reading yet' : 'Reading too old',
    because:
      age === null
        ? 'Nobody has read the temperature of the wort.'
        : `The last reading is ${atMost(age, 0)} minutes old; a pour needs one of the last ${minutes} minutes.`,
    do: 'Stir gently, read the temperature of the wort and enter it.',
    measures: age === null ? [] : [measure('Age of the reading', age, 'minutes', minutes)],
    basis: 'Common practice',
  };
}

function killing(c: number, { yeast }: PourCheck, say: Say): PourFinding | null {
  const limit = neverAbove(yeast);
  if (c < toTenth(limit.c)) return null;
  return {
    rule: 'kills-yeast',
    verdict: 'hold',
    title: 'Kills the yeast',
    because: `The wort is at ${say.temperature(c)}; at ${say.temperature(limit.c)} and above it kills this yeast.`,
    do: 'Let it cool. Nobody can override this one.',
    measures: [measure('Wort', c, '°C', limit.c)],
    basis: limit.own
      ? 'Own limit of the yeast'
      : `Where growth of ${yeast.kind} yeast ends: Handbook of Brewing, 3rd ed.`,
  };
}

const basisOf = ({ own }: PourWindow, kind: string) =>
  own
    ? 'Own pour range of the yeast'
    : `Usual pour range of ${kind} yeast, common practice; the yeast maker’s own goes first`;

function tooWarm(
  c: number,
  { yeast, rules }: PourCheck,
  window: PourWindow,
  say: Say,
): PourFinding | null {
  const over = toTenth(c - toTenth(window.maxC));
  if (over <= 0) return null;
  return {
    rule: 'too-warm',
    verdict: over > rules.pourAboveMind ? 'hold' : 'mind',
    title: `${say.degrees(over)} too warm`,
    because: `The wort is at ${say.temperature(c)}, and the window ends at ${say.temperature(window.maxC)}: warm yeast makes harsher alcohols.`,
    do: `Cool it to ${say.temperature(window.maxC)} or below.`,
    measures: [measure('Wort', c, '°C', window.maxC)],
    basis: basisOf(window, yeast.kind),
  };
}

function tooCold(
  c: number,
  { yeast, rules }: PourCheck,
  window: PourWindow,
  say: Say,
): PourFinding | null {
  const under = toTenth(toTenth(window.minC) - c);
  if (under <= 0) return null;
  const lager = yeast.kind === 'lager' ? ', which is good practice for lagers' : '';
  return {
    rule: 'too-cold',
    verdict: under > rules.pourBelowMind ? 'hold' : 'mind',
    title: `${say.degrees(under)} too cold`,
    because: `The wort is at ${say.temperature(c)}, and the window begins at ${say.temperature(window.minC)}: a slow start${lager}.`,
    do: `Warm it to ${say.temperature(window.minC)} or above, or allow for the slow start.`,
    measures: [measure('Wort', c, '°C', window.minC)],
    basis: basisOf(window, yeast.kind),
  };
}

function warmerCake(c: number, { cake, rules }: PourCheck, say: Say): PourFinding | null {
  if (cake?.c === undefined) return null;
  const over = toTenth(toTenth(cake.c) - c);
  if (over <= rules.warmerCakeMind) return null;
  return {
    rule: 'warmer-cake',
    verdict: 'mind',
    title: 'Cake much warmer',
    because: `The cake is at ${say.temperature(cake.c)}, ${say.degrees(over)} warmer than the wort: yeast that cools in a moment may stop.`,
    do: 'Let the cake cool towards the wort first.',
    measures: [measure('Cake above wort', over, '°C', rules.warmerCakeMind)],
    basis: 'Custom; no published number',
  };
}
