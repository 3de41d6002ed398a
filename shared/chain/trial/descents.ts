import type { Chain } from '../../api/chain.ts';
import type { BatchFacts, Inheritance } from '../../rules/facts.ts';
import { remembered } from '../boardLink.ts';
import { broughtAlong, UNKNOWN_INHERITED } from '../descent.ts';
import { inherit, NOTHING_INHERITED } from '../inherit.ts';
import { Inheritances } from '../inheritances.ts';
import { at, column, NONE } from './numbers.ts';
import type { Trial } from './trial.ts';

type Outside = Extract<Chain['start'], { kind: 'outside' }>;

/** The descent of each batch of a trial: as `descents` says it of a layout, in numbers. */
export class Descents {
  /** By batch; `NONE`: not known. */
  readonly generation: Int32Array;
  /** Number of what the beers before hand down. */
  readonly inherited: Int32Array;
  readonly #trial: Trial;
  readonly #facts: (batch: number) => BatchFacts;
  readonly #inheritances = new Inheritances();
  readonly #nothing = this.#inheritances.number(NOTHING_INHERITED);
  readonly #unknown = this.#inheritances.number(UNKNOWN_INHERITED);
  /** Number of what slurry from outside hands down. */
  readonly #brought = remembered((start: Outside) =>
    this.#inheritances.number(broughtAlong(start)),
  );
  readonly #base: { generation: Int32Array; inherited: Int32Array };
  /** The run of `trace` that a batch was last asked for in, and last answered in. */
  readonly #asked: Int32Array;
  #run = 0;

  constructor(trial: Trial, facts: (batch: number) => BatchFacts) {
    const { length } = trial.roster.batches;
    this.#trial = trial;
    this.#facts = facts;
    this.generation = column(length);
    this.inherited = column(length);
    this.#asked = column(length);
    this.trace(Array.from({ length }, (_, batch) => batch));
    this.#base = { generation: this.generation.slice(), inherited: this.inherited.slice() };
  }

  inheritance(number: number): Inheritance {
    return this.#inheritances.of(number);
  }

  isAsOnBoard(batch: number): boolean {
    const { generation, inherited } = this.#base;
    return (
      this.generation[batch] === generation[batch] && this.inherited[batch] === inherited[batch]
    );
  }

  /** Works out some batches anew; what stands before all of them is as it was. */
  trace(batches: readonly number[]): void {
    this.#run += 1;
    for (const batch of batches) this.#asked[batch] = -this.#run;
    for (const batch of batches) this.#trace(batch);
  }

  undo(batches: readonly number[]): void {
    for (const batch of batches) {
      this.generation[batch] = at(this.#base.generation, batch);
      this.inherited[batch] = at(this.#base.inherited, batch);
    }
  }

  #trace(batch: number): void {
    if (this.#asked[batch] !== -this.#run) return;
    this.#asked[batch] = this.#run;
    const { now } = this.#trial;
    const cake = at(now.before, batch);
    if (cake === NONE) return this.#start(batch);
    // Stands while the way up is walked, so that a circle of chains comes to an end.
    this.#set(batch, NONE, this.#unknown);
    this.#trace(cake);
    const generation = at(this.generation, cake);
    this.#set(batch, generation === NONE ? NONE : generation + 1, this.#inheritedOf(cake));
  }

  #inheritedOf(cake: number): number {
    const before = at(this.inherited, cake);
    const known = this.#inheritances.follower(before, cake);
    if (known !== undefined) return known;
    const after = inherit(this.#inheritances.of(before), this.#facts(cake));
    return this.#inheritances.follow(before, cake, after);
  }

  #start(batch: number): void {
    const start: Chain['start'] | undefined = this.#trial.chain(
      at(this.#trial.now.shelf, batch),
    )?.start;
    if (start?.kind === 'pack') this.#set(batch, 1, this.#nothing);
    else if (start?.kind === 'outside')
      this.#set(batch, start.generation ?? NONE, this.#brought(start));
    else this.#set(batch, NONE, start ? this.#unknown : this.#nothing);
  }

  #set(batch: number, generation: number, inherited: number): void {
    this.generation[batch] = generation;
    this.inherited[batch] = inherited;
  }
}
