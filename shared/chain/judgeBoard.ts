import type { Batch } from '../api/batch.ts';
import type { Chain } from '../api/chain.ts';
import type { UnitPrefs } from '../api/units.ts';
import type { LinkAnswer } from '../rules/answer.ts';
import type { Day, Verdict } from '../rules/vocabulary.ts';
import { isAccepted } from './acceptance.ts';
import type { BoardFacts, BoardIndex } from './board.ts';
import { sightOf, type Sight } from './boardLink.ts';
import { checkLink } from './checkLink.ts';
import { conflictsOf, type Conflict } from './conflicts.ts';
import { costsPerBatch, packsOf } from './cost.ts';
import { rackDay } from './dates.ts';
import { linkInput } from './linkInput.ts';

export type JudgedLink = LinkAnswer & {
  /** Somebody took each of its holds on, with a reason. */
  accepted: boolean;
};

export type VerdictCounts = Record<Verdict, number>;

export interface JudgedChain {
  /** The worst of its links; `pour` without any. */
  verdict: Verdict;
  counts: VerdictCounts;
  /** Generations of the first and last batch; null where not known or without batches. */
  generations: [number, number] | null;
  /** The yeast's own limit, else the house rule. */
  generationLimit: number;
  /** Minor units; null: not known. */
  costPerBatch: number | null;
}

export interface JudgedBoard {
  /** By the later batch. */
  links: ReadonlyMap<string, JudgedLink>;
  chains: ReadonlyMap<string, JudgedChain>;
  /** By batch; absent where not known. */
  generation: ReadonlyMap<string, number>;
  /** Racking day by batch, read or planned. */
  rackOn: ReadonlyMap<string, Day>;
  conflicts: Conflict[];
  totals: VerdictCounts & {
    /** Scrapped ones left out. */
    batches: number;
    onShelves: number;
    chains: number;
    /** Packs to buy. */
    packs: number;
    /** Links of which something could not be checked. */
    unchecked: number;
  };
}

/** Judges every link of a season's board, with all sentences. `units` chooses how they read. */
export function judgeBoard(board: BoardFacts, units?: UnitPrefs): JudgedBoard {
  const sight = sightOf(board, units);
  const { index } = sight;
  const shelved = index.chains.flatMap((chain) => index.batchesOf(chain.id));
  const links = judgeLinks(shelved, sight);
  const costs = costsPerBatch(index);
  return {
    links,
    chains: new Map(
      index.chains.map((chain) => [
        chain.id,
        judgeChain(chain, links, sight, costs.get(chain.id) ?? null),
      ]),
    ),
    generation: knownOf(shelved, (batch) => sight.descent(batch).generation),
    rackOn: knownOf([...shelved, ...index.bench], rackDay),
    conflicts: conflictsOf(index),
    totals: totalsOf(index, shelved.length, links),
  };
}

function judgeLinks(shelved: readonly Batch[], sight: Sight): Map<string, JudgedLink> {
  const links = new Map<string, JudgedLink>();
  for (const { id, link } of shelved) {
    const input = linkInput(id, sight);
    if (!input) continue;
    const answer = checkLink(input);
    links.set(id, { ...answer, accepted: isAccepted(answer, link.acceptance) });
  }
  return links;
}

function judgeChain(
  chain: Chain,
  links: ReadonlyMap<string, JudgedLink>,
  sight: Sight,
  costPerBatch: number | null,
): JudgedChain {
  const { index, rules } = sight;
  const batches = index.batchesOf(chain.id);
  const counts = countVerdicts(batches.flatMap(({ id }) => links.get(id) ?? []));
  return {
    verdict: worstOf(counts),
    counts,
    generations: generationsOf(batches, sight),
    generationLimit: index.yeasts.get(chain.yeastId)?.generationLimit ?? rules.generations,
    costPerBatch,
  };
}

export function countVerdicts(links: Iterable<{ verdict: Verdict }>): VerdictCounts {
  const counts: VerdictCounts = { pour: 0, mind: 0, hold: 0 };
  for (const link of links) counts[link.verdict] += 1;
  return counts;
}

export const worstOf = (counts: VerdictCounts): Verdict =>
  counts.hold > 0 ? 'hold' : counts.mind > 0 ? 'mind' : 'pour';

function generationsOf(batches: readonly Batch[], sight: Sight): [number, number] | null {
  const [first, last] = [batches[0], batches.at(-1)];
  if (!first || !last) return null;
  const [from, to] = [sight.descent(first).generation, sight.descent(last).generation];
  return from === null || to === null ? null : [from, to];
}

function knownOf<V>(batches: readonly Batch[], read: (batch: Batch) => V | null): Map<string, V> {
  const values = new Map<string, V>();
  for (const batch of batches) {
    const value = read(batch);
    if (value !== null) values.set(batch.id, value);
  }
  return values;
}

function totalsOf(
  index: BoardIndex,
  onShelves: number,
  links: ReadonlyMap<string, JudgedLink>,
): JudgedBoard['totals'] {
  const judged = [...links.values()];
  return {
    ...countVerdicts(judged),
    batches: onShelves + index.bench.length,
    onShelves,
    chains: index.chains.length,
    packs: packsOf(index),
    unchecked: judged.filter((link) => link.unchecked.length > 0).length,
  };
}
