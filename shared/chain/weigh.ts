import type { Batch } from '../api/batch.ts';
import type { BoardFacts } from './board.ts';
import { sightOf, type Sight } from './boardLink.ts';
import { countDescent, countVessel } from './trial/counting.ts';
import { Descents } from './trial/descents.ts';
import { Judgement } from './trial/judgement.ts';
import { at, column, NONE } from './trial/numbers.ts';
import { isStill, Pairs, type Pair } from './trial/pairs.ts';
import { eachSharer, startsChains } from './trial/parts.ts';
import { rosterOf, type Roster } from './trial/roster.ts';
import { Trial, type TrialPlace } from './trial/trial.ts';
import { findIn, staysIn, vesselsChanged, type Stay } from './trial/vesselDays.ts';

/** One link of a board that a move changes. */
export interface ChangedLink {
  laterId: string;
  /** Null: no link before (or after). */
  before: Judgement | null;
  after: Judgement | null;
  /** It would stand on another cake than now. */
  relinked: boolean;
}

export interface Weighed {
  /** Links that come about or end, or of which verdict, holds or minds change. */
  changed: ChangedLink[];
  /** Of the moved batch; `NONE`: not known. */
  brewDay: number;
  generation: number;
}

/** What a link was last judged by; `judgement` is null where no cake goes under the batch. */
interface Standing {
  pair: Pair | null;
  inherited: number;
  generation: number;
  find: number;
  judgement: Judgement | null;
}

/**
 * Judges a board's links as they stand and as moves would make them. A move is tried on plain
 * numbers and judged only as far as it reaches: what stands behind a changed place, and what shares
 * a vessel with a changed day. The board must not change meanwhile.
 */
export class Scales {
  readonly sight: Sight;
  readonly roster: Roster;
  readonly #trial: Trial;
  readonly #descents: Descents;
  readonly #pairs: Pairs;
  /** What each batch finds in its vessel, on the board and in the trial. */
  readonly #baseFinds: Int32Array;
  readonly #finds: Int32Array;
  readonly #standing: Standing[] = [];
  /** As each link was last tried: the gaps of one shelf do the same to most of those behind them. */
  readonly #tried: Standing[] = [];
  /** The trial in which a batch was last reached. */
  readonly #lastReached: Int32Array;
  #trials = 0;
  /** Those that the trial at hand reaches, in the order in which they were found. */
  #reached: number[] = [];

  constructor(board: BoardFacts) {
    this.sight = sightOf(board);
    this.roster = rosterOf(this.sight.index);
    const { batches } = this.roster;
    this.#trial = new Trial(this.roster);
    this.#descents = new Descents(this.#trial, (batch) => this.#factsOf(batch));
    this.#pairs = new Pairs(this.#trial, this.sight);
    this.#baseFinds = this.#findAll();
    this.#finds = this.#baseFinds.slice();
    this.#lastReached = column(batches.length);
    batches.forEach((_, batch) => this.#standing.push(this.#judge(batch)));
  }

  /** A link as it stands; null where no cake goes under the batch. */
  standing(batchId: string): Judgement | null {
    return this.#standing[this.roster.numberOf(batchId)]?.judgement ?? null;
  }

  /** The generation of a batch as it stands; `NONE`: not known. */
  generationOf(batchId: string): number {
    return at(this.#descents.generation, this.roster.numberOf(batchId));
  }

  /** To be called between one batch's places and the next one's, so that memory stays small. */
  forget(): void {
    this.#pairs.forget();
  }

  /** What putting a batch somewhere would change. */
  weigh(batch: number, place: TrialPlace): Weighed {
    this.#trial.put(batch, place);
    const reached = this.#reach(batch);
    this.#descents.trace(reached);
    const found = this.#findAnew();
    const changed = this.#changes(reached);
    const brewDay = at(this.#trial.now.brewDay, batch);
    const generation = at(this.#descents.generation, batch);
    this.#descents.undo(reached);
    for (const one of found) this.#finds[one] = at(this.#baseFinds, one);
    this.#trial.undo();
    return { changed, brewDay, generation };
  }

  /**
   * The moved batch, those that stand on another cake, all that descend from them, and who shares
   * a cake with any of these.
   */
  #reach(batch: number): number[] {
    this.#trials += 1;
    const reached: number[] = (this.#reached = []);
    this.#take(batch);
    for (const one of this.#trial.relinked) this.#take(one);
    for (let next = 0; next < reached.length; next += 1)
      this.#trial.eachFollower(reached[next] ?? NONE, this.#take);
    const changed = reached.length;
    for (let next = 0; next < changed; next += 1)
      eachSharer(this.#trial, reached[next] ?? NONE, this.#take);
    return reached;
  }

  /** One function for all trials: it is handed on thousands of times for one lift. */
  readonly #take = (batch: number): void => {
    if (this.#lastReached[batch] === this.#trials) return;
    this.#lastReached[batch] = this.#trials;
    this.#reached.push(batch);
  };

  /** Looks into the vessels whose days changed; what is found otherwise there is reached too. */
  #findAnew(): number[] {
    const trial = this.#trial;
    const found: number[] = [];
    const mates = staysIn(trial, at(trial.now.vessel, trial.moved));
    if (this.#find(trial.moved, mates)) found.push(trial.moved);
    for (const vessel of vesselsChanged(trial)) {
      const stays = staysIn(trial, vessel);
      for (const batch of this.roster.inVessel[vessel] ?? [])
        if (batch !== trial.moved && this.#find(batch, stays)) found.push(batch);
    }
    for (const batch of found) this.#take(batch);
    return found;
  }

  /** True where the batch finds its vessel otherwise than on the board. */
  #find(batch: number, stays: readonly Stay[]): boolean {
    const find = findIn(this.#trial, stays, batch);
    this.#finds[batch] = find;
    return find !== this.#baseFinds[batch];
  }

  #changes(reached: readonly number[]): ChangedLink[] {
    const changes: ChangedLink[] = [];
    for (const batch of reached) {
      const was = this.#standing[batch];
      const tried = this.#judge(batch, was, this.#tried[batch]);
      if (tried !== was) this.#tried[batch] = tried;
      const after = tried.judgement;
      const before = was?.judgement ?? null;
      const relinked = this.#trial.relinked.includes(batch);
      if (relinked ? before !== after : before?.counts !== after?.counts)
        changes.push({ laterId: this.roster.batches[batch]?.id ?? '', before, after, relinked });
    }
    return changes;
  }

  /** Judges a link as the trial stands; a known standing where nothing of it differs. */
  #judge(batch: number, known?: Standing, tried?: Standing): Standing {
    const cake = at(this.#trial.now.before, batch);
    const pair = cake === NONE ? null : this.#pairOf(cake, batch, known?.pair);
    if (!pair) return NO_LINK;
    const inherited = at(this.#descents.inherited, batch);
    const generation = at(this.#descents.generation, batch);
    const find = at(this.#finds, batch);
    const isOld = known?.pair === pair && known.inherited === inherited;
    if (isOld && known.generation === generation && known.find === find) return known;
    if (tried?.pair === pair && tried.inherited === inherited)
      if (tried.generation === generation && tried.find === find) return tried;
    const around = { generation, inherited: this.#descents.inheritance(inherited), find };
    const counts = pair.counts + countDescent(pair, around) + countVessel(pair, around);
    if (isOld && known.judgement?.counts === counts) return known;
    const judgement = new Judgement(counts, pair, around);
    return { pair, inherited, generation, find, judgement };
  }

  #pairOf(cake: number, batch: number, known: Pair | null | undefined): Pair | null {
    const trial = this.#trial;
    const isSame = !trial.relinked.includes(batch) && !startsChains(trial, cake);
    return known && isSame && isStill(known, trial, cake, batch)
      ? known
      : this.#pairs.judge(cake, batch);
  }

  /** What each batch finds as the board stands. */
  #findAll(): Int32Array {
    const finds = new Int32Array(this.roster.batches.length);
    this.roster.inVessel.forEach((batches, vessel) => {
      const stays = staysIn(this.#trial, vessel);
      for (const batch of batches) finds[batch] = findIn(this.#trial, stays, batch);
    });
    return finds;
  }

  #factsOf(batch: number) {
    const row: Batch | undefined = this.roster.batches[batch];
    if (!row) throw new RangeError(`No batch ${batch}`);
    return this.sight.facts(row);
  }
}

const NO_LINK: Standing = {
  pair: null,
  inherited: NONE,
  generation: NONE,
  find: 0,
  judgement: null,
};
