import type { Verdict } from '../rules/vocabulary.ts';
import type { Judgement } from './trial/judgement.ts';
import type { ChangedLink } from './weigh.ts';

/** A link that the brewer is told of at the gap: it comes about by the drop, or gets worse by it. */
export const countsAtGap = ({ relinked, before, after }: ChangedLink): boolean =>
  after !== null && (relinked || after.counts > (before?.counts ?? -1));

/** A link that comes about, ends, or is judged otherwise than now. */
export const differs = ({ relinked, before, after }: ChangedLink): boolean =>
  relinked || before?.counts !== after?.counts;

/**
 * The worst over some links as they would be. The short reasons and the colour shift are worked
 * out when they are first asked for: a lifted batch has hundreds of gaps, and few are read.
 */
export class GapVerdict {
  readonly verdict: Verdict;
  readonly holds: number;
  readonly minds: number;
  readonly #links: readonly Judgement[];

  constructor(links: readonly ChangedLink[]) {
    this.#links = links.flatMap((link) => link.after ?? []);
    this.holds = sum(this.#links, (link) => link.holds);
    this.minds = sum(this.#links, (link) => link.minds);
    this.verdict = this.holds > 0 ? 'hold' : this.minds > 0 ? 'mind' : 'pour';
  }

  /** Titles, worst first. */
  reasons(): string[] {
    const worstFirst = this.#links.toSorted((a, b) => b.holds - a.holds || b.minds - a.minds);
    return [...new Set(worstFirst.flatMap((link) => link.reason ?? []))];
  }

  /** Largest ΔE00; 0 without a link; null where one is not known. */
  colourShift(): number | null {
    let largest = 0;
    for (const { deltaE00 } of this.#links) {
      if (deltaE00 === null) return null;
      largest = Math.max(largest, deltaE00);
    }
    return largest;
  }
}

const sum = <T>(all: readonly T[], figure: (one: T) => number): number =>
  all.reduce((total, one) => total + figure(one), 0);
