import type { Day, Verdict } from '../rules/vocabulary.ts';
import type { Gap } from './gap.ts';
import type { Place } from './gapPlaces.ts';
import type { Lock } from './plan.ts';
import type { Judgement } from './trial/judgement.ts';
import type { ChangedLink } from './weigh.ts';

/** A link that the brewer is told of at the gap: it comes about by the drop, or gets worse by it. */
const countsAtGap = ({ relinked, before, after }: ChangedLink): boolean =>
  after !== null && (relinked || after.counts > (before?.counts ?? -1));

/** A place and what putting the batch there would change. */
export interface WeighedPlace {
  place: Place;
  changed: readonly ChangedLink[];
  /** Of the batch there. */
  brewOn: Day | null;
  generation: number | null;
}

/**
 * A gap with the worst over the links that it is judged by. The short reasons and the colour shift
 * are worked out when they are asked for: a lifted batch has hundreds of gaps, and few are read.
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
  readonly changes: Gap['changes'];
  readonly #links: readonly Judgement[];
  #colourShift: number | null | undefined;

  constructor({ place, changed, brewOn, generation }: WeighedPlace) {
    const links: Judgement[] = [];
    for (const link of changed) if (link.after && countsAtGap(link)) links.push(link.after);
    this.key = place.key;
    this.toChainId = place.toChainId;
    this.afterBatchId = place.afterId;
    this.here = place.here;
    this.locked = place.locked;
    this.holds = sum(links, 'holds');
    this.minds = sum(links, 'minds');
    this.verdict = this.holds > 0 ? 'hold' : this.minds > 0 ? 'mind' : 'pour';
    this.brewOn = brewOn;
    this.generation = generation;
    this.changes = place.here ? [] : changesOf(changed);
    this.#links = links;
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

const changesOf = (changed: readonly ChangedLink[]): Gap['changes'] =>
  changed.map(({ laterId, after }) => ({ laterId, verdict: after?.verdict ?? 'pour' }));

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
