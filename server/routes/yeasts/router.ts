import { and, eq, sql } from 'drizzle-orm';
import {
  yeast as contract,
  yeastCreate,
  yeastPatch,
  type Yeast,
  type YeastCreate,
} from '#shared/api/yeast.ts';
import { api } from '#shared/api/urls.ts';
import { tellYeast } from '#shared/record/sentences.ts';
import { yeast, yeastLine } from '../../db/schema/stock.ts';
import { pathOf } from '../../http/pathOf.ts';
import type { WhereSeen } from '../stock/kind.ts';
import { stockRoutes } from '../stock/routes.ts';

const isRow = ({ breweryId, id, version }: WhereSeen) =>
  and(eq(yeast.breweryId, breweryId), eq(yeast.id, id), eq(yeast.version, version));

export const yeastRoutes = stockRoutes<Yeast, YeastCreate>({
  word: 'yeast',
  field: 'yeastId',
  addresses: {
    all: pathOf(api.yeasts(':brewery')),
    single: pathOf(api.yeast(':brewery', ':id')),
  },
  row: contract,
  create: yeastCreate,
  patch: yeastPatch,
  rowsOf: ({ yeasts }) => yeasts,
  insert: (tx, values) =>
    tx.insert(yeast).values(values).onConflictDoNothing().returning({ id: yeast.id }),
  update: (tx, where, fields) =>
    tx
      .update(yeast)
      .set({ ...fields, version: sql`${yeast.version} + 1` })
      .where(isRow(where))
      .returning({ id: yeast.id }),
  async remove(tx, where) {
    // Lines of shelves that are gone; one that is still used would have been named before.
    await tx.delete(yeastLine).where(eq(yeastLine.yeastId, where.id));
    return tx.delete(yeast).where(isRow(where)).returning({ id: yeast.id });
  },
  tell: tellYeast,
});
