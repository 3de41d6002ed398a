import { and, eq, sql } from 'drizzle-orm';
import {
  vessel as contract,
  vesselCreate,
  vesselPatch,
  type Vessel,
  type VesselCreate,
} from '#shared/api/vessel.ts';
import { api } from '#shared/api/urls.ts';
import { tellVessel } from '#shared/record/sentences.ts';
import { vessel } from '../../db/schema/stock.ts';
import { pathOf } from '../../http/pathOf.ts';
import type { WhereSeen } from '../stock/kind.ts';
import { stockRoutes } from '../stock/routes.ts';

const isRow = ({ breweryId, id, version }: WhereSeen) =>
  and(eq(vessel.breweryId, breweryId), eq(vessel.id, id), eq(vessel.version, version));

export const vesselRoutes = stockRoutes<Vessel, VesselCreate>({
  word: 'vessel',
  field: 'vesselId',
  addresses: {
    all: pathOf(api.vessels(':brewery')),
    single: pathOf(api.vessel(':brewery', ':id')),
  },
  row: contract,
  create: vesselCreate,
  patch: vesselPatch,
  rowsOf: ({ vessels }) => vessels,
  insert: (tx, values) =>
    tx.insert(vessel).values(values).onConflictDoNothing().returning({ id: vessel.id }),
  update: (tx, where, fields) =>
    tx
      .update(vessel)
      .set({ ...fields, version: sql`${vessel.version} + 1` })
      .where(isRow(where))
      .returning({ id: vessel.id }),
  remove: (tx, where) => tx.delete(vessel).where(isRow(where)).returning({ id: vessel.id }),
  tell: tellVessel,
});
