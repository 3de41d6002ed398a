import type { Day, Verdict } from '../rules/vocabulary.ts';
import type { Gap } from './gap.ts';
import type { Place } from './gapPlaces.ts';
import type { Lock } from './plan.ts';
import type { Judgement } from './trial/judgement.ts';
import type { ChangedLink } from './weigh.ts';

/** A link that the brewer is told of at the gap: it comes about by the drop, or gets worse by it. */
const countsAtGap = (after: Judgement, { relinked, before }: ChangedLink): boolean =>
  relinked || after.counts > (before?.counts ?? -1);

/** A place and what putting the batch there would change. */
export interface WeighedPlace {
  place: Place;
  changed: readonly ChangedLink[];
  /** Of the batch there. */
  brewOn: Day | null;
  generation: number | null;
}

/**
 * A gap with the worst over the links that it is judged by. What changes, the short reasons and the
 * colour shift are worked out when they are asked for: a lifted batch has hundreds of gaps, and few
 * are read.
 */
export class JudgedGap implements Gap {
  readonly key: string;
  readonly toChainId: string;
  readonly afterBatchId: string | null;
  readonly here: boolean;
  readonly locked: Lock | null;
  readonly verdict: Verdict;
  readonly holds: number;
  readonly minds: number;
  readonly brewOn: Day | null;
  best = false;
  readonly generation: number | null;
  readonly #changed: readonly ChangedLink[];
  readonly #links: readonly Judgement[];
  #colourShift: number | null | undefined;

  constructor({ place, changed, brewOn, generation }: WeighedPlace) {
    const links: Judgement[] = [];
    let holds = 0;
    let minds = 0;
    for (const link of changed) {
      if (link.after === null || !countsAtGap(link.after, link)) continue;
      links.push(link.after);
      holds += link.after.holds;
      minds += link.after.minds;
    }
    this.key = place.key;
    this.toChainId = place.toChainId;
    this.afterBatchId = place.afterId;
    this.here = place.here;
    this.locked = place.locked;
    this.holds = holds;
    this.minds = minds;
    this.verdict = holds > 0 ? 'hold' : minds > 0 ? 'mind' : 'pour';
    this.brewOn = brewOn;
    this.generation = generation;
    this.#changed = place.here ? [] : changed;
    this.#links = links;
  }

  get changes(): Gap['changes'] {
    return this.#changed.map(({ laterId, after }) => ({
      laterId,
      verdict: after?.verdict ?? 'pour',
    }));
  }

  /** Titles, worst first. */
  get reasons(): string[] {
    const worstFirst = this.#links.toSorted((a, b) => b.counts - a.counts);
    return [...new Set(worstFirst.flatMap((link) => link.reason ?? []))];
  }

  /** Largest ΔE00; 0 without a link; null where one is not known. */
  get colourShift(): number | null {
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
