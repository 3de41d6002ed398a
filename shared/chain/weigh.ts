import type { Batch } from '../api/batch.ts';
import type { BatchFacts, Inheritance } from '../rules/facts.ts';
import { lineageStanding } from '../rules/lineage.ts';
import type { Verdict } from '../rules/vocabulary.ts';
import type { BoardFacts, Layout } from './board.ts';
import { cakeYeastOf, sightOf, type Sight } from './boardLink.ts';
import { descents, type Descent } from './descent.ts';
import { inherit } from './inherit.ts';
import { Inheritances } from './inheritances.ts';
import { daysFrom, LinkMemo, sharesText, type Judgement } from './linkMemo.ts';
import type { Plan } from './plan.ts';
import { RevisedUses } from './revisedUses.ts';
import { takersOf } from './shares.ts';

/** One link of a board that a plan touches, before and after. */
export interface ChangedLink {
  laterId: string;
  /** Null: no link before (or after). */
  before: Judgement | null;
  after: Judgement | null;
  /** It would stand on another cake than now. */
  relinked: boolean;
}

export interface Weighed {
  changed: ChangedLink[];
  descent(batch: Batch): Descent;
}

/**
 * Judges a board's links as they stand and as plans would make them, each plan only as far as it
 * differs: what stands behind a changed place or date, what hangs on that, and what shares a vessel
 * with it. The board must not change meanwhile.
 */
export class Scales {
  readonly sight: Sight;
  readonly #inheritances = new Inheritances();
  readonly #memo = new LinkMemo(this.#inheritances);
  readonly #uses: RevisedUses;
  readonly #standing = new Map<string, Judgement | null>();

  constructor(board: BoardFacts) {
    const base = sightOf(board);
    this.sight = { ...base, descent: descents(base.layout, this.#handDown) };
    this.#uses = new RevisedUses(this.sight);
  }

  readonly #handDown = (before: Inheritance, earlier: Batch): Inheritance =>
    this.#inheritances.after(before, earlier.id, () => inherit(before, this.sight.facts(earlier)));

  /** A link as it stands; null where no cake goes under the batch. */
  standing(batchId: string): Judgement | null {
    const known = this.#standing.get(batchId);
    if (known !== undefined) return known;
    const judgement = this.#judge(batchId, this.sight);
    this.#standing.set(batchId, judgement);
    return judgement;
  }

  weigh({ draft, relinked }: Plan): Weighed {
    const behind = behindChanges(this.sight.layout, draft);
    const uses = this.#uses.in(draft);
    const sight: Sight = {
      ...this.sight,
      layout: draft,
      facts: (batch) => this.#redated(batch),
      descent: descents(draft, this.#handDown, (id) => this.#settled(id, behind)),
      use: (id) => uses.get(id) ?? this.sight.use(id),
    };
    const changed: ChangedLink[] = [];
    const sharing = besides(this.sight.layout, draft, [...behind, ...relinked]);
    for (const laterId of new Set([...behind, ...relinked, ...uses.keys(), ...sharing])) {
      if (!uses.has(laterId) && this.#onlyDescends(laterId, sight)) continue;
      const after = this.#judge(laterId, sight);
      const before = this.standing(laterId);
      if (before ?? after)
        changed.push({ laterId, before, after, relinked: relinked.includes(laterId) });
    }
    return { changed, descent: sight.descent };
  }

  #judge(laterId: string, sight: Sight): Judgement | null {
    const later = sight.layout.batch(laterId);
    const earlier = sight.layout.predecessor(laterId);
    return later && earlier ? this.#memo.judge(earlier, later, sight) : null;
  }

  /** True of a link in which at most its descent is new, and no rule stands otherwise for that. */
  #onlyDescends(laterId: string, sight: Sight): boolean {
    const [was, now] = [this.sight.index.batch(laterId), sight.layout.batch(laterId)];
    const before = this.sight.layout.predecessor(laterId);
    const earlier = sight.layout.predecessor(laterId);
    if (!was || !now || !before || before.id !== earlier?.id) return false;
    if (was.chainId !== now.chainId || before.chainId !== earlier.chainId) return false;
    if (!sameDays(before, was, earlier, now)) return false;
    if (sharesText(before, laterId, this.sight) !== sharesText(earlier, laterId, sight))
      return false;
    return this.#lineage(was, this.sight) === this.#lineage(now, sight);
  }

  #lineage(later: Batch, sight: Sight): string {
    const { generation, inherited } = sight.descent(later);
    const yeast = cakeYeastOf(later, sight);
    if (!yeast) return '';
    return lineageStanding({
      b: this.sight.facts(this.sight.index.batch(later.id) ?? later),
      yeast,
      rules: sight.rules,
      generation: generation ?? undefined,
      inherited,
    });
  }

  /** Of a batch's facts a draft changes only the brew day. Without a new day none is changed. */
  #redated(batch: Batch): BatchFacts {
    const was = this.sight.index.batch(batch.id) ?? batch;
    const facts = this.sight.facts(was);
    if (batch.brewOn === null || batch.brewOn === was.brewOn) return facts;
    return { ...facts, brewOn: batch.brewOn };
  }

  /** The descent of a batch that stands before every change is the board's. */
  #settled(batchId: string, behind: ReadonlySet<string>): Descent | undefined {
    const batch = behind.has(batchId) ? undefined : this.sight.layout.batch(batchId);
    return batch && this.sight.descent(batch);
  }
}

/** Batches at and behind the first difference of each chain, and of chains that hang on them. */
function behindChanges(base: Layout, draft: Plan['draft']): Set<string> {
  const behind = new Set<string>();
  const takeFrom = (batches: readonly Batch[], first: number): void => {
    for (let at = first; at < batches.length; at += 1) {
      const id = batches[at]?.id;
      if (id === undefined || behind.has(id)) continue;
      behind.add(id);
      hangOn(id);
    }
  };
  const hangOn = (batchId: string): void => {
    for (const branch of draft.branchesOf(batchId)) takeFrom(draft.batchesOf(branch.id), 0);
  };
  for (const [chainId, now] of draft.orders) {
    const was = base.batchesOf(chainId);
    const first = now.findIndex((batch, place) => batch !== was[place]);
    if (first >= 0) takeFrom(now, first);
  }
  for (const id of draft.rows.keys()) {
    behind.add(id);
    hangOn(id);
  }
  return behind;
}

/** Who takes of the same cakes, before or after: another's part may leave them more or less. */
function besides(base: Layout, draft: Plan['draft'], changed: readonly string[]): string[] {
  return changed
    .flatMap((id) => {
      const was = base.predecessor(id);
      const now = draft.predecessor(id);
      const sources = now && now.id !== was?.id ? [was, now] : [was];
      return sources.flatMap((source) =>
        source && draft.branchesOf(source.id).length > 0 ? takersOf(draft, source) : [],
      );
    })
    .map(({ id }) => id);
}

/** True where the days from brew day to brew day, and to the taking, are as they were. */
function sameDays(before: Batch, was: Batch, earlier: Batch, now: Batch): boolean {
  return (
    daysFrom(before, was.brewOn) === daysFrom(earlier, now.brewOn) &&
    daysFrom(before, was.link.takenOn) === daysFrom(earlier, now.link.takenOn)
  );
}

const RANK: Record<Verdict, number> = { pour: 0, mind: 1, hold: 2 };

/** Whether a link's verdict, or else the number of its holds and minds, is worse than before. */
export function isWorse(after: Judgement, before: Judgement | null): boolean {
  if (!before) return true;
  const byVerdict = RANK[after.verdict] - RANK[before.verdict];
  return (byVerdict || after.holds - before.holds || after.minds - before.minds) > 0;
}
