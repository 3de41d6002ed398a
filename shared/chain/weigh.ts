import type { Batch } from '../api/batch.ts';
import type { Inheritance } from '../rules/facts.ts';
import type { Verdict } from '../rules/vocabulary.ts';
import type { BoardFacts, Layout } from './board.ts';
import { linkBetween, remembered, sightOf, type Sight } from './boardLink.ts';
import { judgeLink } from './checkLink.ts';
import { descents, type Descent } from './descent.ts';
import { inherit } from './inherit.ts';
import { inheritances } from './inheritances.ts';
import type { Plan } from './plan.ts';
import { revisedUses } from './revisedUses.ts';

type Judgement = ReturnType<typeof judgeLink>;

/** One link of a board that a plan changes, before and after. */
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

/** A board's links judged as they stand and as plans would make them; the board must not change. */
export interface Scales {
  sight: Sight;
  /** A link as it stands; null where no cake goes under the batch. */
  standing(batchId: string): Judgement | null;
  weigh(plan: Plan): Weighed;
}

/**
 * Judges plans of one board, each only as far as it differs: what stands behind a changed place or
 * date, what hangs on that, and what shares a vessel with it. The same link met again in another
 * plan is judged once.
 */
export function scalesOf(board: BoardFacts): Scales {
  const base = sightOf(board);
  const shared = inheritances();
  const handDown = (before: Inheritance, earlier: Batch): Inheritance =>
    shared.after(before, earlier.id, () => inherit(before, base.facts(earlier)));
  const baseDescent = descents(base.layout, handDown);
  const judged = new Map<string, Judgement | null>();

  const judge = (earlier: Batch, later: Batch, sight: Sight): Judgement | null => {
    const { generation, inherited } = sight.descent(later);
    const use = sight.use(later.id);
    const key = [
      earlier.id,
      later.id,
      later.chainId,
      earlier.brewOn,
      later.brewOn,
      later.link.takenOn,
      generation,
      shared.number(inherited),
      use?.takenBy === undefined,
      use?.beersSinceCleaning,
    ].join();
    const known = judged.get(key);
    if (known !== undefined) return known;
    const input = linkBetween(earlier, later, sight);
    const judgement = input ? judgeLink(input) : null;
    judged.set(key, judgement);
    return judgement;
  };

  const baseSight: Sight = { ...base, descent: baseDescent };
  const standingOf = remembered((later: Batch): { judgement: Judgement | null } => {
    const earlier = base.layout.predecessor(later.id);
    return { judgement: earlier ? judge(earlier, later, baseSight) : null };
  });
  const standing = (batchId: string): Judgement | null => {
    const later = base.layout.batch(batchId);
    return later ? standingOf(later).judgement : null;
  };

  const weigh = (plan: Plan): Weighed => {
    const { draft } = plan;
    const behind = behindChanges(base.layout, plan);
    const settled = (id: string): Descent | undefined => {
      const batch = behind.has(id) ? undefined : base.layout.batch(id);
      return batch && baseDescent(batch);
    };
    const uses = revisedUses(base, draft);
    const sight: Sight = {
      ...base,
      layout: draft,
      descent: descents(draft, handDown, settled),
      use: (id) => uses.get(id) ?? base.use(id),
    };
    const relinked = new Set(plan.relinked);
    const touched = new Set([...behind, ...relinked, ...uses.keys()]);
    const changed = [...touched].map((laterId): ChangedLink => {
      const later = draft.batch(laterId);
      const earlier = draft.predecessor(laterId);
      const after = later && earlier ? judge(earlier, later, sight) : null;
      return { laterId, before: standing(laterId), after, relinked: relinked.has(laterId) };
    });
    return { changed, descent: sight.descent };
  };
  return { sight: baseSight, standing, weigh };
}

/** Batches at and behind the first difference of each chain, and of chains that hang on them. */
function behindChanges(base: Layout, { draft }: Plan): Set<string> {
  const behind = new Set<string>();
  const take = (batches: readonly Batch[]): void => {
    for (const batch of batches) {
      if (behind.has(batch.id)) continue;
      behind.add(batch.id);
      hang(batch.id);
    }
  };
  const hang = (batchId: string): void => {
    for (const branch of draft.branchesOf(batchId)) take(draft.batchesOf(branch.id));
  };
  for (const [chainId, now] of draft.orders) {
    const was = base.batchesOf(chainId);
    const first = now.findIndex((batch, place) => batch !== was[place]);
    if (first >= 0) take(now.slice(first));
  }
  for (const id of draft.rows.keys()) hang(id);
  return behind;
}

/** How bad a judgement is: for comparing two. */
const RANK: Record<Verdict, number> = { pour: 0, mind: 1, hold: 2 };

export const isWorse = (after: Judgement, before: Judgement | null): boolean =>
  before === null ||
  RANK[after.verdict] - RANK[before.verdict] > 0 ||
  (after.verdict === before.verdict &&
    (after.holds - before.holds || after.minds - before.minds) > 0);
