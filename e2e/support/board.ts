import { randomUUID } from 'node:crypto';
import { cake } from '../../server/db/schema/cake.ts';
import { batch, chain } from '../../server/db/schema/chain.ts';
import { vessel, yeast, yeastLine } from '../../server/db/schema/stock.ts';
import type { Db, Tx } from '../../server/db/client.ts';
import type { TestBrewery } from './brewery.ts';

type BatchFacts = Partial<
  Omit<typeof batch.$inferInsert, 'id' | 'breweryId' | 'seasonId' | 'chainId' | 'place'>
>;

export interface BoardPlan {
  readonly shelves?: readonly {
    readonly name: string;
    readonly kind?: 'ale' | 'lager';
    readonly capacityL?: number;
    readonly batches: readonly (BatchFacts & { readonly name: string })[];
  }[];
  readonly bench?: readonly (BatchFacts & { readonly name: string })[];
}

export interface WrittenBoard {
  /** By name. */
  readonly batches: Readonly<Record<string, string>>;
  readonly chains: Readonly<Record<string, string>>;
}

/** A plain beer of the rules' worked cases: what a test does not speak of is unremarkable. */
const PLAIN: BatchFacts = {
  volumeL: 23,
  og: 1.044,
  fg: 1.011,
  srm: 4,
  ibu: 20,
  fermentC: 20,
  daysUnderBeer: 14,
  dryHops: [],
  additions: [],
  allergens: ['gluten'],
  cultures: [],
};

/** Writes shelves and a bench into a brewery's season: a yeast and a vessel of its own for each shelf. */
export async function writeBoard(db: Db, to: TestBrewery, plan: BoardPlan): Promise<WrittenBoard> {
  return db.transaction(async (tx) => {
    const chains: Record<string, string> = {};
    const batches: Record<string, string> = {};
    for (const [position, shelf] of (plan.shelves ?? []).entries()) {
      const chainId = await writeShelf(tx, to, shelf, position);
      chains[shelf.name] = chainId;
      Object.assign(batches, await writeBatches(tx, to, chainId, shelf.batches));
    }
    Object.assign(batches, await writeBatches(tx, to, null, plan.bench ?? []));
    return { batches, chains };
  });
}

async function writeShelf(
  tx: Tx,
  { id: breweryId, seasonId }: TestBrewery,
  shelf: NonNullable<BoardPlan['shelves']>[number],
  position: number,
): Promise<string> {
  const [yeastId, vesselId, lineId, chainId] = [
    randomUUID(),
    randomUUID(),
    randomUUID(),
    randomUUID(),
  ];
  const lager = shelf.kind === 'lager';
  await tx.insert(yeast).values({
    id: yeastId,
    breweryId,
    name: `Yeast of ${shelf.name}`.slice(0, 60),
    kind: shelf.kind ?? 'ale',
    character: false,
    fermentMinC: lager ? 8 : 18,
    fermentMaxC: lager ? 14 : 22,
    generationLimit: 7,
    attenuation: 0.75,
    packPrice: 900,
  });
  await tx.insert(vessel).values({
    id: vesselId,
    breweryId,
    name: `Fermenter of ${shelf.name}`.slice(0, 60),
    shape: 'conical',
    capacityL: shelf.capacityL ?? 32,
    blowOff: false,
  });
  await tx.insert(yeastLine).values({ id: lineId, breweryId, yeastId });
  await tx.insert(chain).values({
    id: chainId,
    breweryId,
    seasonId,
    name: shelf.name,
    yeastId,
    vesselId,
    lineId,
    position,
    startKind: 'pack',
    startPrice: 900,
  });
  return chainId;
}

async function writeBatches(
  tx: Tx,
  { id: breweryId, seasonId }: TestBrewery,
  chainId: string | null,
  facts: readonly (BatchFacts & { readonly name: string })[],
): Promise<Record<string, string>> {
  const ids: Record<string, string> = {};
  for (const [place, each] of facts.entries()) {
    const id = randomUUID();
    ids[each.name] = id;
    await tx.insert(batch).values({ ...PLAIN, ...each, id, breweryId, seasonId, chainId, place });
    if (each.stage === 'fermenting' || each.stage === 'racked') {
      await tx
        .insert(cake)
        .values({ batchId: id, state: each.stage === 'racked' ? 'bare' : 'growing' });
    }
  }
  return ids;
}
