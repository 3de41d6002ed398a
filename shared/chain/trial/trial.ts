import type { Chain } from '../../api/chain.ts';
import { at, NONE } from './numbers.ts';
import { newShelfOf, type Roster, type Standing } from './roster.ts';

/** Where a batch is tried. */
export interface TrialPlace {
  /** Number of the chain; the one after the last is a new shelf; `NONE`: the bench. */
  shelf: number;
  /** The batch to stand behind; `NONE`: first. */
  after: number;
  /** The new shelf. */
  added: Chain | null;
  /** The day of a batch that comes first on a shelf without a date. */
  ownDay: () => number;
}

/**
 * A season in which one batch is tried elsewhere, dates pulled along, and put back: on plain
 * numbers what `planMove` does on rows. `put` may be called again only after `undo`.
 */
export class Trial {
  readonly roster: Roster;
  readonly now: Standing;
  /** The batch that was moved. */
  moved = NONE;
  added: Chain | null = null;
  /** Batches that stand on another cake than on the board, the moved one first. */
  relinked: number[] = [];
  /** Batches whose brew day or day of taking was set; some may be as they were. */
  redated: number[] = [];
  readonly #touched: number[] = [];
  readonly #shelves: number[] = [];

  constructor(roster: Roster) {
    this.roster = roster;
    const { shelf, before, after, first, brewDay, takenDay, vessel } = roster.standing;
    this.now = {
      shelf: shelf.slice(),
      before: before.slice(),
      after: after.slice(),
      first: first.slice(),
      brewDay: brewDay.slice(),
      takenDay: takenDay.slice(),
      vessel: vessel.slice(),
    };
  }

  put(batch: number, place: TrialPlace): void {
    const { now, roster } = this;
    this.moved = batch;
    this.added = place.added;
    const left = this.#takeOut(batch);
    const next = place.shelf === NONE ? NONE : this.#putIn(batch, place);
    now.vessel[batch] = this.#vesselAt(batch, place);
    for (const one of [batch, left, next])
      if (one !== NONE && this.#isRelinked(one)) this.#relink(one);
    if (place.shelf !== NONE && now.brewDay[batch] === NONE && now.before[batch] === NONE)
      this.#redate(batch, place.ownDay(), at(now.takenDay, batch));
    if (left !== NONE) this.#pull(left);
    if (place.shelf !== NONE) this.#pull(batch);
    if (roster.standing.vessel[batch] !== now.vessel[batch]) this.redated.push(batch);
  }

  undo(): void {
    const { now, roster, moved } = this;
    const { standing } = roster;
    for (const batch of this.#touched) {
      if (batch === NONE) continue;
      now.before[batch] = at(standing.before, batch);
      now.after[batch] = at(standing.after, batch);
    }
    for (const shelf of this.#shelves) now.first[shelf] = at(standing.first, shelf);
    for (const batch of [...this.relinked, ...this.redated]) {
      now.brewDay[batch] = at(standing.brewDay, batch);
      now.takenDay[batch] = at(standing.takenDay, batch);
    }
    now.shelf[moved] = at(standing.shelf, moved);
    now.vessel[moved] = at(standing.vessel, moved);
    this.#touched.length = this.#shelves.length = 0;
    this.relinked = [];
    this.redated = [];
  }

  chain(shelf: number): Chain | undefined {
    const { roster } = this;
    if (shelf === newShelfOf(roster)) return this.added ?? undefined;
    return roster.index.chains[shelf];
  }

  isShifted(batch: number): boolean {
    return this.now.brewDay[batch] !== this.roster.standing.brewDay[batch];
  }

  /** The batches whose cake is this one's: the next in the chain, and the first of each branch. */
  eachFollower(batch: number, tell: (follower: number) => void): void {
    const next = at(this.now.after, batch);
    if (next !== NONE) tell(next);
    for (const branch of this.roster.branches[batch] ?? []) {
      const first = at(this.now.first, branch);
      if (first !== NONE) tell(first);
    }
  }

  /** When the beer is racked: the day that was read, else brew day and days under beer. */
  rackDay(batch: number): number {
    const { roster, now } = this;
    const read = at(roster.rackedDay, batch);
    if (read !== NONE) return read;
    const day = at(now.brewDay, batch);
    const count = at(roster.daysUnderBeer, batch);
    return day === NONE || count === NONE ? NONE : day + count;
  }

  #isRelinked(batch: number): boolean {
    return this.now.before[batch] !== this.roster.standing.before[batch];
  }

  /** Takes the batch out of its chain; answers with the one that stood behind it. */
  #takeOut(batch: number): number {
    const { shelf, before, after, first } = this.now;
    const from = at(shelf, batch);
    if (from === NONE) return NONE;
    const [cake, next] = [at(before, batch), at(after, batch)];
    this.#touched.push(batch, cake, next);
    this.#shelves.push(from);
    if (first[from] === batch) first[from] = next;
    else after[cake] = next;
    if (next !== NONE) before[next] = cake;
    shelf[batch] = before[batch] = after[batch] = NONE;
    return next;
  }

  /** Puts the batch in; answers with the one that stands behind it then. */
  #putIn(batch: number, place: TrialPlace): number {
    const { shelf, before, after, first } = this.now;
    const isFirst = place.after === NONE;
    const next = isFirst ? at(first, place.shelf) : at(after, place.after);
    this.#touched.push(batch, place.after, next);
    this.#shelves.push(place.shelf);
    shelf[batch] = place.shelf;
    before[batch] = isFirst ? at(this.roster.source, place.shelf) : place.after;
    after[batch] = next;
    if (isFirst) first[place.shelf] = batch;
    else after[place.after] = batch;
    if (next !== NONE) before[next] = batch;
    return next;
  }

  #vesselAt(batch: number, { shelf }: TrialPlace): number {
    const own = this.roster.batches[batch]?.vesselId ?? null;
    return this.roster.vesselNumberOf(own ?? this.chain(shelf)?.vesselId ?? null);
  }

  /** Nothing is settled of a link that comes about. */
  #relink(batch: number): void {
    if (this.relinked.includes(batch)) return;
    this.relinked.push(batch);
    this.now.takenDay[batch] = NONE;
  }

  #redate(batch: number, brewDay: number, takenDay: number): void {
    const { now } = this;
    if (now.brewDay[batch] === brewDay && now.takenDay[batch] === takenDay) return;
    now.brewDay[batch] = brewDay;
    now.takenDay[batch] = takenDay;
    this.redated.push(batch);
  }

  /** As `pullAlong`, from one batch on. */
  #pull(from: number): void {
    const { now, roster } = this;
    const waiting = [from];
    // A chain that hangs on itself can only come from damaged data; it must not turn for ever.
    for (let chains = 0; chains < waiting.length && chains < MOST_CHAINS; chains += 1)
      for (let batch = waiting[chains] ?? NONE; batch !== NONE; batch = at(now.after, batch)) {
        if (!roster.pencilled[batch]) break;
        const cake = at(now.before, batch);
        const isNew = this.relinked.includes(batch);
        if (!isNew && (cake === NONE || !this.isShifted(cake))) break;
        if (cake !== NONE) this.#pullTo(batch, cake, isNew);
        if (!this.isShifted(batch)) continue;
        for (const branch of roster.branches[batch] ?? []) waiting.push(at(now.first, branch));
      }
  }

  /** The batch brewed on the day the yeast is taken from the one before. */
  #pullTo(batch: number, cake: number, isNew: boolean): void {
    const { now } = this;
    const taken = isNew ? at(now.takenDay, batch) : this.#shiftedTaking(batch, cake);
    const day = taken === NONE ? this.rackDay(cake) : taken;
    this.#redate(batch, day === NONE ? at(now.brewDay, batch) : day, taken);
  }

  /** A planned day of taking shifts with the beer it is taken from. */
  #shiftedTaking(batch: number, cake: number): number {
    const { standing } = this.roster;
    const [planned, from] = [at(standing.takenDay, batch), at(standing.brewDay, cake)];
    const to = at(this.now.brewDay, cake);
    return planned === NONE || from === NONE || to === NONE ? planned : planned + to - from;
  }
}

const MOST_CHAINS = 1000;
