import type { Batch } from '../api/batch.ts';
import type { Chain, ChainStart } from '../api/chain.ts';
import type { Vessel } from '../api/vessel.ts';
import type { Yeast } from '../api/yeast.ts';
import type { Inheritance } from '../rules/facts.ts';
import type { BoardFacts } from './board.ts';
import { sightOf, type Sight } from './boardLink.ts';
import { broughtAlong, type Descent } from './descent.ts';
import { inherit, NOTHING_INHERITED } from './inherit.ts';

/** One chain without the rest of its brewery: what somebody from elsewhere may see. */
export interface ChainAlone {
  /** Where it starts from another chain's cake, that cake as slurry from outside. */
  chain: Chain;
  startsFromCake: boolean;
  /** Its own yeast and those its batches ask for. */
  yeasts: Yeast[];
  /** Its own vessel and those of its batches. */
  vessels: Vessel[];
  /** In order, without scrapped ones. */
  batches: Batch[];
  /** What any of its beers may hold by now. */
  carries: Inheritance;
}

/** Names no batch: a chain that starts from it starts from a cake of which nothing is known. */
const LOST_CAKE = '00000000-0000-4000-8000-000000000000';
const MOST_GENERATIONS = 60;

/** @returns null where the chain is not on the board */
export function chainAlone(board: BoardFacts, chainId: string): ChainAlone | null {
  const sight = sightOf(board);
  const { index } = sight;
  const chain = index.chain(chainId);
  if (!chain) return null;
  const batches = [...index.batchesOf(chainId)];
  const before = startDescent(chain, batches[0], sight);
  const needed = <T extends { id: string }>(rows: readonly T[], ids: (string | null)[]) =>
    rows.filter(({ id }) => ids.includes(id));
  return {
    chain: { ...chain, start: startAlone(chain.start, before) },
    startsFromCake: chain.start.kind === 'cake',
    yeasts: needed(board.yeasts, [chain.yeastId, ...batches.map(({ yeastId }) => yeastId)]),
    vessels: needed(board.vessels, [chain.vesselId, ...batches.map(({ vesselId }) => vesselId)]),
    batches,
    carries: batches
      .map((batch) => sight.facts(batch))
      .reduce((handed, facts) => inherit(handed, facts), before.inherited),
  };
}

/** Where the first beer of the chain stands in the descent of its yeast, also where there is none yet. */
function startDescent(chain: Chain, first: Batch | undefined, sight: Sight): Descent {
  if (first) return sight.descent(first);
  const { start } = chain;
  const unknown: Descent = {
    generation: null,
    inherited: { ...NOTHING_INHERITED, allergensUnknown: true, culturesUnknown: true },
  };
  if (start.kind === 'pack') return { generation: 1, inherited: NOTHING_INHERITED };
  if (start.kind === 'outside')
    return { generation: start.generation, inherited: broughtAlong(start) };
  const source = sight.index.batch(start.batchId);
  if (!source) return unknown;
  const { generation, inherited } = sight.descent(source);
  return {
    generation: generation === null ? null : generation + 1,
    inherited: inherit(inherited, sight.facts(source)),
  };
}

/** Of another chain's cake only its generation and what it hands down go along. */
function startAlone(start: ChainStart, { generation, inherited }: Descent): ChainStart {
  if (start.kind !== 'cake') return start;
  if (generation === null) return { kind: 'cake', batchId: LOST_CAKE };
  return {
    kind: 'outside',
    generation: Math.min(generation, MOST_GENERATIONS),
    price: null,
    // Known in part counts as unknown: the check then says that it could not be made.
    allergens: inherited.allergensUnknown ? null : [...inherited.allergens],
    cultures: inherited.culturesUnknown ? null : [...inherited.cultures],
  };
}
