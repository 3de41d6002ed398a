import type { Yeast } from '#shared/api/yeast.ts';
import type { yeast } from '../../db/schema/stock.ts';

export function presentYeast({ breweryId: _, ...row }: typeof yeast.$inferSelect): Yeast {
  return row;
}
