import type { Verdict } from '../rules/vocabulary.ts';
import type { Judgement } from './trial/judgement.ts';
import type { ChangedLink } from './weigh.ts';

/** A link that the brewer is told of at the gap: it comes about by the drop, or gets worse by it. */
const countsAtGap = ({ relinked, before, after }: ChangedLink): boolean =>
  after !== null && (relinked || after.counts > (before?.counts ?? -1));

/**
 * The worst over some links as they would be. The short reasons and the colour shift are worked
 * out when they are first asked for: a lifted batch has hundreds of gaps, and few are read.
 */
export class GapVerdict {
  readonly verdict: Verdict;
  readonly holds: number;
  readonly minds: number;
  readonly #links: readonly Judgement[];
  #colourShift: number | null | undefined;

  constructor(changed: readonly ChangedLink[]) {
    const links: Judgement[] = [];
    for (const link of changed) if (link.after && countsAtGap(link)) links.push(link.after);
    this.#links = links;
    this.holds = sum(links, 'holds');
    this.minds = sum(links, 'minds');
    this.verdict = this.holds > 0 ? 'hold' : this.minds > 0 ? 'mind' : 'pour';
  }

  /** Titles, worst first. */
  reasons(): string[] {
    const worstFirst = this.#links.toSorted((a, b) => b.counts - a.counts);
    return [...new Set(worstFirst.flatMap((link) => link.reason ?? []))];
  }

  /** Largest ΔE00; 0 without a link; null where one is not known. */
  colourShift(): number | null {
    if (this.#colourShift === undefined) this.#colourShift = largestShift(this.#links);
    return this.#colourShift;
  }
}

function largestShift(links: readonly Judgement[]): number | null {
  let largest = 0;
  for (const { deltaE00 } of links) {
    if (deltaE00 === null) return null;
    largest = Math.max(largest, deltaE00);
  }
  return largest;
}

const sum = (links: readonly Judgement[], figure: 'holds' | 'minds'): number =>
  links.reduce((total, link) => total + link[figure], 0);
