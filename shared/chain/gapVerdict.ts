import type { Verdict } from '../rules/vocabulary.ts';
import { isWorse, type ChangedLink } from './weigh.ts';

/** A link that the brewer is told of at the gap: it comes about by the drop, or gets worse by it. */
export const countsAtGap = ({ relinked, before, after }: ChangedLink): boolean =>
  after !== null && (relinked || isWorse(after, before));

/** A link that comes about, ends, or is judged otherwise than now. */
export const differs = ({ relinked, before, after }: ChangedLink): boolean =>
  relinked ||
  before?.verdict !== after?.verdict ||
  before?.holds !== after?.holds ||
  before?.minds !== after?.minds;

export interface GapVerdict {
  verdict: Verdict;
  holds: number;
  minds: number;
  reasons: string[];
  colourShift: number | null;
}

/** The worst over some links as they would be, with the short reasons, worst first. */
export function gapVerdict(links: readonly ChangedLink[]): GapVerdict {
  const after = links.flatMap((link) => link.after ?? []);
  const holds = after.reduce((sum, link) => sum + link.holds, 0);
  const minds = after.reduce((sum, link) => sum + link.minds, 0);
  const worstFirst = after.toSorted((a, b) => b.holds - a.holds || b.minds - a.minds);
  const reasons = worstFirst.flatMap((link) =>
    link.verdict === 'pour' ? [] : (link.reason ?? []),
  );
  const shifts = after.map((link) => link.deltaE00);
  return {
    verdict: holds > 0 ? 'hold' : minds > 0 ? 'mind' : 'pour',
    holds,
    minds,
    reasons: [...new Set(reasons)],
    colourShift: shifts.includes(null) ? null : Math.max(0, ...shifts.map((shift) => shift ?? 0)),
  };
}
