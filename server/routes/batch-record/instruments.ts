import { and, asc, eq, sql } from 'drizzle-orm';
import type { Instrument, InstrumentCreate, InstrumentPatch } from '#shared/api/reading.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db, Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { instrument } from '../../db/schema/readings.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { notFound } from '../../problems.ts';
import { writeEntry } from '../board/record.ts';
import { presentInstrument } from './present.ts';
import type { Scene } from './scene.ts';

export async function instrumentsOf(db: Db | Tx, breweryId: string): Promise<Instrument[]> {
  const rows = await db
    .select()
    .from(instrument)
    .where(eq(instrument.breweryId, breweryId))
    .orderBy(asc(instrument.name), asc(instrument.id));
  return rows.map(presentInstrument);
}

export const addInstrument = (
  { db, clock }: Scene,
  member: Member,
  body: InstrumentCreate,
): Promise<Instrument> =>
  inTransaction(db, async (tx) => {
    const known = await found(tx, member, body.id);
    if (isRepeated(known, body)) return known;
    const made = await tx
      .insert(instrument)
      .values({ ...body, breweryId: member.brewery.id, createdAt: clock.now() })
      .onConflictDoNothing({ target: instrument.id })
      .returning();
    demandMade(made);
    const after = await one(tx, member, body.id);
    await record(tx, member, clock.now(), `Added the instrument ${body.name}`, null, after);
    return after;
  });

/** Another correction counts for readings from now on: what was worked out before stays. */
export const editInstrument = (
  { db, clock }: Scene,
  member: Member,
  { id, version }: { id: string | undefined; version: number },
  { retired, ...patch }: InstrumentPatch,
): Promise<Instrument> =>
  inTransaction(db, async (tx) => {
    const before = await one(tx, member, id ?? '');
    demandVersion(version, before.version, before);
    const retiredAt = retired === undefined ? {} : { retiredAt: retired ? clock.now() : null };
    await tx
      .update(instrument)
      .set({ ...patch, ...retiredAt, version: sql`${instrument.version} + 1` })
      .where(eq(instrument.id, before.id));
    const after = await one(tx, member, before.id);
    await record(tx, member, clock.now(), `Changed the instrument ${after.name}`, before, after);
    return after;
  });

async function found(tx: Tx, { brewery }: Member, id: string): Promise<Instrument | undefined> {
  const [row] = await tx
    .select()
    .from(instrument)
    .where(and(eq(instrument.breweryId, brewery.id), eq(instrument.id, id)))
    .for('update');
  return row && presentInstrument(row);
}

async function one(tx: Tx, member: Member, id: string): Promise<Instrument> {
  const row = await found(tx, member, id);
  if (!row) throw notFound();
  return row;
}

const record = (
  tx: Tx,
  member: Member,
  now: Date,
  what: string,
  before: Instrument | null,
  after: Instrument,
) => writeEntry(tx, member, now, { kind: 'edit', what, before, after, touches: [after.id] });
