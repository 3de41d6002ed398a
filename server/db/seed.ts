import { randomUUID } from 'node:crypto';
import { addDays, weekday } from '#shared/units/day.ts';
import type { Clock } from '../clock.ts';
import { hashPassword } from '../auth/passwords.ts';
import { dayIn } from '../today.ts';
import type { Db, Tx } from './client.ts';
import { DEMO_BENCH, DEMO_CHAINS, type DemoBatch, type DemoChain } from './demo/batches.ts';
import { DEMO_BREWERY, DEMO_PASSWORD, DEMO_PEOPLE, DEMO_SEASON } from './demo/people.ts';
import { DEMO_VESSELS, DEMO_YEASTS, type VesselKey, type YeastKey } from './demo/stock.ts';
import { brewery, houseRules, membership } from './schema/brewery.ts';
import { cake } from './schema/cake.ts';
import { batch, chain } from './schema/chain.ts';
import { person } from './schema/people.ts';
import { season } from './schema/season.ts';
import { vessel, yeast, yeastLine } from './schema/stock.ts';

const UNITS = { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' } as const;
const SATURDAY = 6;

/** Of the five Saturdays up to today, the first. */
export function firstBrewDay(today: string): string {
  return addDays(today, -((weekday(today) - SATURDAY + 7) % 7) - 28);
}

interface Place {
  tx: Tx;
  breweryId: string;
  seasonId: string;
  /** Days count from here. */
  first: string;
  now: Date;
}

/** The demo brewery, dated from now on backwards; once: where it stands already nothing is done. */
export async function seedDemo(db: Db, clock: Clock): Promise<void> {
  const now = clock.now();
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  await db.transaction(async (tx) => {
    const breweryId = randomUUID();
    const made = await tx
      .insert(brewery)
      .values({ id: breweryId, ...DEMO_BREWERY, units: UNITS })
      .onConflictDoNothing()
      .returning({ id: brewery.id });
    if (made.length === 0) return;
    const seasonId = randomUUID();
    await tx.insert(houseRules).values({ breweryId });
    await tx.insert(season).values({ id: seasonId, breweryId, name: DEMO_SEASON, createdAt: now });
    await addPeople(tx, breweryId, passwordHash);
    const first = firstBrewDay(dayIn(DEMO_BREWERY.timeZone, now));
    await addSeason({ tx, breweryId, seasonId, first, now });
  });
}

async function addPeople(tx: Tx, breweryId: string, passwordHash: string): Promise<void> {
  for (const { name, email, role } of DEMO_PEOPLE) {
    const id = randomUUID();
    await tx.insert(person).values({ id, name, email, passwordHash, units: UNITS });
    await tx.insert(membership).values({ breweryId, personId: id, role });
  }
}

async function addSeason(place: Place): Promise<void> {
  const { tx, breweryId } = place;
  const yeasts = idsFor(DEMO_YEASTS);
  const vessels = idsFor(DEMO_VESSELS);
  for (const [key, row] of Object.entries(DEMO_YEASTS))
    await tx.insert(yeast).values({ ...row, id: yeasts[key as YeastKey], breweryId });
  for (const [key, row] of Object.entries(DEMO_VESSELS))
    await tx.insert(vessel).values({ ...row, id: vessels[key as VesselKey], breweryId });
  for (const [position, shelf] of DEMO_CHAINS.entries())
    await addChain(place, shelf, position, yeasts[shelf.yeast], vessels[shelf.vessel]);
  for (const [at, each] of DEMO_BENCH.entries()) await addBatch(place, each, null, at, false);
}

const idsFor = <K extends string>(rows: Record<K, unknown>): Record<K, string> =>
  Object.fromEntries(Object.keys(rows).map((key) => [key, randomUUID()])) as Record<K, string>;

async function addChain(
  place: Place,
  { name, start, batches }: DemoChain,
  position: number,
  yeastId: string,
  vesselId: string,
): Promise<void> {
  const { tx, breweryId, seasonId } = place;
  const id = randomUUID();
  await tx.insert(yeastLine).values({ id, breweryId, yeastId });
  await tx.insert(chain).values({
    id,
    breweryId,
    seasonId,
    name,
    yeastId,
    vesselId,
    lineId: id,
    position,
    startKind: start.kind,
    ...(start.kind === 'outside' && {
      startGeneration: start.generation,
      startAllergens: start.allergens,
      startCultures: start.cultures,
    }),
    startPrice: start.price,
  });
  for (const [at, each] of batches.entries()) {
    const next = batches[at + 1];
    await addBatch(place, each, id, at, next !== undefined && next.stage !== 'pencilled');
  }
}

async function addBatch(
  { tx, breweryId, seasonId, first, now }: Place,
  { plan, brewDay, stage, read }: DemoBatch,
  chainId: string | null,
  at: number,
  poured: boolean,
): Promise<void> {
  const id = randomUUID();
  await tx.insert(batch).values({
    ...plan,
    id,
    breweryId,
    seasonId,
    chainId,
    place: at,
    stage,
    brewOn: brewDay === null ? null : addDays(first, brewDay),
    readVolumeL: read?.volumeL,
    readOg: read?.og,
    readFg: read?.fg,
    rackedOn: read?.rackDay === undefined ? null : addDays(first, read.rackDay),
    createdAt: now,
  });
  if (stage === 'pencilled') return;
  const state = poured ? 'poured' : stage === 'racked' ? 'bare' : 'growing';
  await tx.insert(cake).values({ batchId: id, state });
}
