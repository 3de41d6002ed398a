import { thumbKg } from '../cake/keep.ts';
import type { LinkAnswer } from '../rules/answer.ts';
import { adviceFor } from '../rules/advice.ts';
import { judgeRules, write, type Standings } from '../rules/findings.ts';
import type { LinkInput } from '../rules/linkInput.ts';
import { LinkState } from '../rules/linkState.ts';
import { SAY_DEFAULT, sayIn, type Say } from '../rules/say.ts';
import type { RuleId, Verdict } from '../rules/vocabulary.ts';

export type { LinkInput } from '../rules/linkInput.ts';

/** A link's verdict without its sentences. */
export interface LinkVerdict {
  verdict: Verdict;
  holds: number;
  minds: number;
  unchecked: number;
  worstRule: RuleId | null;
  /** Shift of the later beer's colour in the glass; null where unknown. */
  readonly deltaE00: number | null;
  /** Title of the worst finding, null on a pour. */
  readonly reason: string | null;
}

/**
 * The verdict of a link alone, for places that are judged by the hundred: sentences are not
 * written, and colour shift and reason are worked out only when they are read.
 */
export function judgeLink(input: LinkInput): LinkVerdict {
  const link = new LinkState(input);
  const { found, holds, minds, unchecked } = judgeRules(link);
  const worst = found[0];
  return {
    verdict: worst?.verdict ?? 'pour',
    holds,
    minds,
    unchecked: unchecked.length,
    worstRule: worst?.rule.id ?? null,
    get deltaE00() {
      return link.colourShift ?? null;
    },
    get reason() {
      return worst === undefined ? null : write(worst, link, sayFor(input)).title;
    },
  };
}

/**
 * Judges the cake of one batch under the wort of the next, with its sentences.
 *
 * Facts in, answer out: litres, SG, SRM, IBU, °C, days; an absent fact is unknown, and a rule that
 * needs it is unchecked unless the known facts already decide. Figures that cannot be worked out are
 * null. Numbers are not rounded here.
 */
export function checkLink(input: LinkInput): LinkAnswer {
  const link = new LinkState(input);
  return answer(link, judgeRules(link), sayFor(input));
}

const sayFor = ({ units }: LinkInput): Say => (units === undefined ? SAY_DEFAULT : sayIn(units));

function answer(link: LinkState, { found, passed, unchecked }: Standings, say: Say): LinkAnswer {
  const { a, b, times, need } = link;
  return {
    from: a.id,
    to: b.id,
    verdict: found[0]?.verdict ?? 'pour',
    generation: link.generation ?? null,
    takenOn: times.takenOn ?? null,
    waitDays: times.waitDays ?? null,
    findings: found.map((one) => write(one, link, say)),
    passed,
    unchecked,
    advice: adviceFor(link, say),
    blend: blendFigures(link),
    cake: cakeFigures(link),
    need: { viableCells: need ?? null },
    keep: keepFigures(link),
  };
}

function blendFigures(link: LinkState): LinkAnswer['blend'] {
  const { og, srm, ibu } = link.blend;
  return {
    og: og ?? null,
    srm: srm ?? null,
    ibu: ibu ?? null,
    deltaE00: link.colourShift ?? null,
  };
}

function cakeFigures({ cake }: LinkState): LinkAnswer['cake'] {
  return {
    viableCells: cake?.viableCells ?? null,
    volumeL: cake?.volumeL.likely ?? null,
    massKg: cake?.massKg.likely ?? null,
    volumeInterval: cake?.volumeL ?? null,
    measured: cake?.measured ?? false,
  };
}

function keepFigures(link: LinkState): LinkAnswer['keep'] {
  const { kept, recommended, b, yeast } = link;
  const known = b.volumeL !== undefined && b.og !== undefined;
  return {
    keptL: kept.keptL ?? null,
    ratio: kept.ratio !== undefined && Number.isFinite(kept.ratio) ? kept.ratio : null,
    recommendedL: recommended?.litres ?? null,
    recommendedKg: recommended?.kg ?? null,
    thumbKg: known ? thumbKg({ volumeL: b.volumeL ?? 0, og: b.og ?? 1, kind: yeast.kind }) : null,
  };
}
