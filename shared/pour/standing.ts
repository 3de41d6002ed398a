import type { PourObjection } from '../api/pour.ts';
import type { UnitPrefs } from '../api/units.ts';
import { NEVER_ACCEPTED } from '../chain/acceptance.ts';
import { yeastFactsOf } from '../chain/batchFacts.ts';
import { indexBoard, type BoardFacts, type BoardIndex } from '../chain/board.ts';
import { rulesOf } from '../chain/boardLink.ts';
import { judgeBoard, type JudgedLink } from '../chain/judgeBoard.ts';
import { sayIn } from '../rules/say.ts';
import type { Finding } from '../rules/answer.ts';
import type { Day, Verdict } from '../rules/vocabulary.ts';
import { DEFAULT_UNITS } from '../units/quantity.ts';
import { checkPour, type PourAnswer, type PourCheck } from './check.ts';
import type { Reading } from './forecast.ts';

/** What is known of a pour at one moment. */
export interface PourMoment {
  board: BoardFacts;
  /** The batch whose wort is poured. */
  batchId: string;
  /** The moment that is judged, and the brewery's day then. */
  at: number;
  day: Day;
  /** None later than `at`. */
  readings: readonly Reading[];
  coolantC?: number | null | undefined;
  units?: UnitPrefs;
}

export interface PourStanding {
  /** What the temperature says. */
  wort: PourAnswer;
  /** What the link says, as if brewed on this day; null: no cake is before it. */
  link: JudgedLink | null;
  /** Holds of the link that nobody took on. */
  linkHolds: Finding[];
  /** The worst of both; an accepted link counts as mind. */
  verdict: Verdict;
  /** The temperature is good enough and the link lets it: a reading alone gives leave. */
  clear: boolean;
  /** A head brewer may give leave, with a written reason. */
  overridable: boolean;
}

/** How a pour stands: the wort's temperature and the link together. Null: no such batch on a shelf. */
export function pourStanding(moment: PourMoment): PourStanding | null {
  const { board, batchId, units } = moment;
  const today = asBrewedOn(board, batchId, moment.day);
  const check = pourCheckOf(moment, indexBoard(today), judgeBoard(today, units).links.get(batchId));
  if (!check) return null;
  const wort = checkPour(check.pour, sayIn(units ?? DEFAULT_UNITS));
  const { link } = check;
  const linkHolds =
    link && !link.accepted ? link.findings.filter(({ verdict }) => verdict === 'hold') : [];
  const clear = wort.verdict !== 'hold' && linkHolds.length === 0;
  return {
    wort,
    link,
    linkHolds,
    verdict: worst(wort.verdict, linkVerdict(link, linkHolds)),
    clear,
    overridable:
      !clear &&
      (wort.verdict !== 'hold' || wort.overridable) &&
      !linkHolds.some(({ rule }) => NEVER_ACCEPTED.includes(rule)),
  };
}

/**
 * True of what ends every leave, also one that was given before it was there: a temperature that
 * kills, or a hold of the link that nobody may take on. A reading that grew old does not: leave has
 * a time of its own.
 */
export const endsLeave = ({ wort, linkHolds }: Pick<PourStanding, 'wort' | 'linkHolds'>): boolean =>
  wort.findings.some(({ rule }) => rule === 'kills-yeast') ||
  linkHolds.some(({ rule }) => NEVER_ACCEPTED.includes(rule));

const linkVerdict = (link: JudgedLink | null, holds: readonly Finding[]): Verdict =>
  holds.length > 0 ? 'hold' : link && link.verdict !== 'pour' ? 'mind' : 'pour';

const RANK: Record<Verdict, number> = { pour: 0, mind: 1, hold: 2 };
const worst = (a: Verdict, b: Verdict): Verdict => (RANK[a] >= RANK[b] ? a : b);

/** The wort is there now, whatever day was planned. */
function asBrewedOn(board: BoardFacts, batchId: string, day: Day): BoardFacts {
  const batches = board.batches.map((batch) =>
    batch.id === batchId && batch.stage === 'pencilled' ? { ...batch, brewOn: day } : batch,
  );
  return { ...board, batches };
}

function pourCheckOf(
  { board, batchId, at, readings, coolantC }: PourMoment,
  index: BoardIndex,
  link: JudgedLink | undefined,
): { pour: PourCheck; link: JudgedLink | null } | null {
  const batch = index.batch(batchId);
  const before = index.predecessor(batchId);
  const chain = index.chain(before?.chainId ?? batch?.chainId ?? '');
  const yeast = index.yeasts.get(chain?.yeastId ?? '');
  if (!batch || !yeast) return null;
  const og = batch.read.og ?? batch.og;
  const volumeL = batch.read.volumeL ?? batch.volumeL;
  const pour: PourCheck = {
    yeast: yeastFactsOf(yeast),
    at,
    readings,
    wort: og !== null && volumeL !== null ? { volumeL, og } : undefined,
    cake: before
      ? {
          volumeL: link?.keep.keptL ?? undefined,
          c: batch.link.cakeC ?? before.fermentC ?? undefined,
        }
      : undefined,
    coolantC: coolantC ?? undefined,
    rules: rulesOf(board),
  };
  return { pour, link: link ?? null };
}

/** All that speaks against the pour, worst first, as the record keeps it. */
export function objectionsOf({ wort, link, linkHolds }: PourStanding): PourObjection[] {
  const of = (one: Pick<Finding, 'verdict' | 'title' | 'because'> & { rule: string }) => ({
    rule: one.rule,
    verdict: one.verdict,
    title: one.title,
    because: one.because,
  });
  const minds = link?.findings.filter((one) => !linkHolds.includes(one)) ?? [];
  return [
    ...wort.findings.filter(({ verdict }) => verdict === 'hold').map(of),
    ...linkHolds.map(of),
    ...wort.findings.filter(({ verdict }) => verdict === 'mind').map(of),
    ...minds.map((one) => ({ ...of(one), verdict: 'mind' as const })),
  ];
}
