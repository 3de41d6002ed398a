import type { Batch } from '../api/batch.ts';
import type { UnitPrefs } from '../api/units.ts';
import type { Yeast } from '../api/yeast.ts';
import type { BatchFacts, BoardContext, PourFacts, YeastFacts } from '../rules/facts.ts';
import type { LinkInput } from '../rules/linkInput.ts';
import { DEFAULT_HOUSE_RULES, resolveHouseRules, type HouseRules } from '../rules/resolve.ts';
import { factsOf, pourFactsOf, vesselFactsOf, yeastFactsOf } from './batchFacts.ts';
import { cakeCheckOf } from './cakeChecked.ts';
import type { BoardFacts, BoardIndex, Layout } from './board.ts';
import { descents, type Descent } from './descent.ts';
import { indexedBoard } from './indexedBoard.ts';
import { inherit } from './inherit.ts';
import { staysByVessel, useOfVessel, vesselIdOf, type Stay, type VesselUse } from './vesselUse.ts';

/** All that the links of one layout of a board are read with. */
export interface Sight {
  index: BoardIndex;
  layout: Layout;
  rules: HouseRules;
  units: UnitPrefs | undefined;
  facts(batch: Batch): BatchFacts;
  yeastFacts(yeast: Yeast): YeastFacts;
  descent(batch: Batch): Descent;
  use(batchId: string): VesselUse | undefined;
}

/** What of it one link is read with. */
export type LinkSight = Omit<Sight, 'layout'> & {
  layout: Pick<Layout, 'chain' | 'predecessor'>;
};

/** The board as it stands, read once. */
export function sightOf(board: BoardFacts, units?: UnitPrefs): Sight {
  const index = indexedBoard(board);
  const facts = remembered(factsOf);
  return {
    index,
    layout: index,
    rules: rulesOf(board),
    units,
    facts,
    yeastFacts: remembered(yeastFactsOf),
    descent: descents(index, (before, earlier) => inherit(before, facts(earlier))),
    use: usesOf(index),
  };
}

const rulesMade = new WeakMap<BoardFacts['houseRules'], HouseRules>();

/** The brewery's house rules; the defaults where what is stored cannot stand. */
export function rulesOf({ houseRules }: Pick<BoardFacts, 'houseRules'>): HouseRules {
  const known = rulesMade.get(houseRules);
  if (known) return known;
  const resolved = resolveHouseRules(houseRules);
  const rules = resolved.ok ? resolved.rules : DEFAULT_HOUSE_RULES;
  rulesMade.set(houseRules, rules);
  return rules;
}

export function remembered<K extends object, V>(make: (key: K) => V): (key: K) => V {
  const made = new Map<K, V>();
  return (key) => {
    const known = made.get(key);
    if (known !== undefined) return known;
    const value = make(key);
    made.set(key, value);
    return value;
  };
}

/** What batches find in their vessels; a vessel is looked into when one of its batches is asked for. */
function usesOf(index: BoardIndex): (batchId: string) => VesselUse | undefined {
  let byVessel: ReadonlyMap<string, readonly Stay[]> | undefined;
  const looked = new Map<string, ReadonlyMap<string, VesselUse>>();
  const usesIn = (vesselId: string) => {
    byVessel ??= staysByVessel(index);
    const cleanedOn = index.vessels.get(vesselId)?.cleanedOn ?? null;
    const uses = useOfVessel(byVessel.get(vesselId) ?? [], cleanedOn);
    looked.set(vesselId, uses);
    return uses;
  };
  return (batchId) => {
    const batch = index.batch(batchId);
    const vesselId = batch ? vesselIdOf(batch, index) : null;
    if (vesselId === null) return undefined;
    return (looked.get(vesselId) ?? usesIn(vesselId)).get(batchId);
  };
}

/**
 * The link of two batches that stand together, as if nobody else got of the cake; null where the
 * yeast is not on the board.
 */
export function unsharedLink(earlier: Batch, later: Batch, sight: LinkSight): LinkInput | null {
  const { index, layout } = sight;
  const chain = later.chainId === null ? undefined : layout.chain(later.chainId);
  // The yeast of the cake is its source's, which is the chain's but for branches.
  const source = earlier.chainId === null ? chain : layout.chain(earlier.chainId);
  const yeast = index.yeasts.get(source?.yeastId ?? '');
  if (!yeast) return null;
  const { generation, inherited } = sight.descent(later);
  const vessel = chain?.vesselId ? index.vessels.get(chain.vesselId) : undefined;
  const pour = pourFactsOf(later, earlier);
  const own = later.vesselId ? index.vessels.get(later.vesselId) : undefined;
  pour.vessel = own && vesselFactsOf(own);
  pour.otherYeast = otherYeast(index.yeasts.get(later.yeastId ?? chain?.yeastId ?? ''), yeast);
  pour.beersSinceCleaning = sight.use(later.id)?.beersSinceCleaning;
  return {
    earlier: sight.facts(earlier),
    later: sight.facts(later),
    pour,
    yeast: sight.yeastFacts(yeast),
    vessel: vessel && vesselFactsOf(vessel),
    generation: generation ?? undefined,
    inherited,
    rules: sight.rules,
    board: boardContext(earlier, later, sight),
    units: sight.units,
    wholeCakeBefore: earlier.link.keepWhole && layout.predecessor(earlier.id) !== null,
  };
}

/** The yeast that the later batch asks for where that is not the cake's. */
const otherYeast = (wanted: Yeast | undefined, yeast: Yeast): PourFacts['otherYeast'] =>
  wanted === undefined || wanted.id === yeast.id
    ? undefined
    : { kind: wanted.kind, character: wanted.character };

function boardContext(earlier: Batch, later: Batch, sight: LinkSight): BoardContext {
  return {
    vesselTakenBy: sight.use(later.id)?.takenBy,
    cakeCheck: cakeCheckOf(earlier, later, sight) ?? undefined,
  };
}
