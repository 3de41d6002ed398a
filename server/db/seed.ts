import { eq } from 'drizzle-orm';
import { randomUUID } from 'node:crypto';
import { addDays, weekday } from '#shared/units/day.ts';
import type { Clock } from '../clock.ts';
import { hashPassword } from '../auth/passwords.ts';
import { saidOf } from '../routes/comments/said.ts';
import { dayIn } from '../today.ts';
import type { Db, Tx } from './client.ts';
import { DEMO_BENCH, DEMO_CHAINS, type DemoChain } from './demo/batches.ts';
import type { DemoBatch } from './demo/demoBatch.ts';
import { PAST_CHAINS, PAST_SEASON } from './demo/pastSeason.ts';
import { DEMO_BREWERY, DEMO_PASSWORD, DEMO_PEOPLE, DEMO_SEASON } from './demo/people.ts';
import { addDemoReadings } from './demoReadings.ts';
import { DEMO_VESSELS, DEMO_YEASTS, type VesselKey, type YeastKey } from './demo/stock.ts';
import { DEMO_TALK } from './demo/talk.ts';
import { brewery, houseRules, membership } from './schema/brewery.ts';
import { cake } from './schema/cake.ts';
import { batch, chain } from './schema/chain.ts';
import { person } from './schema/people.ts';
import { season } from './schema/season.ts';
import { vessel, yeast, yeastLine } from './schema/stock.ts';
import { comment } from './schema/talk.ts';

const UNITS = { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' } as const;
const SATURDAY = 6;
const DAY_MS = 86_400_000;

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
  stock: Stock;
}

interface Stock {
  yeasts: Record<YeastKey, string>;
  vessels: Record<VesselKey, string>;
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
    const first = firstBrewDay(dayIn(DEMO_BREWERY.timeZone, now));
    const people = await addPeople(tx, breweryId, passwordHash);
    const stock = await addStock(tx, breweryId);
    await addPastSeason({ tx, breweryId, first, now, stock });
    await tx.insert(season).values({ id: seasonId, breweryId, name: DEMO_SEASON, createdAt: now });
    await tx.update(brewery).set({ currentSeasonId: seasonId }).where(eq(brewery.id, breweryId));
    const place = { tx, breweryId, seasonId, first, now, stock };
    await addChains(place, DEMO_CHAINS);
    for (const [at, each] of DEMO_BENCH.entries()) await addBatch(place, each, null, at, false);
    await addTalk(place, people);
    await addDemoReadings(place, people);
  });
}

async function addPeople(
  tx: Tx,
  breweryId: string,
  passwordHash: string,
): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const { name, email, role } of DEMO_PEOPLE) {
    const id = randomUUID();
    await tx.insert(person).values({ id, name, email, passwordHash, units: UNITS });
    await tx.insert(membership).values({ breweryId, personId: id, role });
    ids.set(name, id);
  }
  return ids;
}

async function addStock(tx: Tx, breweryId: string): Promise<Stock> {
  const yeasts = idsFor(DEMO_YEASTS);
  const vessels = idsFor(DEMO_VESSELS);
  for (const [key, row] of Object.entries(DEMO_YEASTS))
    await tx.insert(yeast).values({ ...row, id: yeasts[key as YeastKey], breweryId });
  for (const [key, row] of Object.entries(DEMO_VESSELS))
    await tx.insert(vessel).values({ ...row, id: vessels[key as VesselKey], breweryId });
  return { yeasts, vessels };
}

/** Brewed to its end, and archived. */
async function addPastSeason(here: Omit<Place, 'seasonId'>): Promise<void> {
  const { tx, breweryId, now } = here;
  const id = randomUUID();
  const { name, before, lasts } = PAST_SEASON;
  const first = addDays(here.first, -before);
  await tx.insert(season).values({
    id,
    breweryId,
    name,
    firstDay: first,
    lastDay: addDays(first, lasts),
    archivedAt: now,
    createdAt: new Date(now.getTime() - before * DAY_MS),
  });
  await addChains({ ...here, seasonId: id, first }, PAST_CHAINS);
}

async function addChains(place: Place, chains: readonly DemoChain[]): Promise<void> {
  for (const [position, shelf] of chains.entries()) await addChain(place, shelf, position);
}

/** Nobody has read any of it but who wrote it. */
async function addTalk(
  { tx, breweryId, seasonId, now }: Place,
  people: ReadonlyMap<string, string>,
): Promise<void> {
  const inSeason = { chains: eq(chain.seasonId, seasonId), batches: eq(batch.seasonId, seasonId) };
  const chains = await tx.select().from(chain).where(inSeason.chains);
  const batches = await tx.select().from(batch).where(inSeason.batches);
  const idOf = (rows: readonly { id: string; name: string }[], name: string) => {
    const found = rows.find((row) => row.name === name);
    if (!found) throw new Error(`The demo has no ${name}`);
    return found.id;
  };
  const member = { brewery: { id: breweryId, timeZone: DEMO_BREWERY.timeZone } };
  for (const { by, chain: on, batch: of, about, daysAgo, text } of DEMO_TALK) {
    const chainId = idOf(chains, on);
    const batchId = of === undefined ? null : idOf(batches, of);
    const said =
      about === 'link' && batchId !== null
        ? await saidOf(
            { tx, member, chain: { id: chainId, seasonId }, now },
            { kind: about, batchId },
          )
        : null;
    await tx.insert(comment).values({
      id: randomUUID(),
      breweryId,
      chainId,
      about,
      batchId,
      verdict: said,
      personId: people.get(by) ?? '',
      text,
      createdAt: new Date(now.getTime() - daysAgo * DAY_MS),
    });
  }
}

const idsFor = <K extends string>(rows: Record<K, unknown>): Record<K, string> =>
  Object.fromEntries(Object.keys(rows).map((key) => [key, randomUUID()])) as Record<K, string>;

async function addChain(
  place: Place,
  { name, start, batches, ...stands }: DemoChain,
  position: number,
): Promise<void> {
  const { tx, breweryId, seasonId, stock } = place;
  const yeastId = stock.yeasts[stands.yeast];
  const vesselId = stock.vessels[stands.vessel];
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
  { plan, brewDay, stage, read, dumped }: DemoBatch,
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
  const left = stage === 'racked' ? 'bare' : 'growing';
  const state = poured ? 'poured' : dumped ? 'dumped' : left;
  await tx.insert(cake).values({ batchId: id, state });
}
