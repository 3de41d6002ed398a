import type { Vessel } from '#shared/api/vessel.ts';
import type { vessel } from '../../db/schema/stock.ts';

export function presentVessel({ breweryId: _, ...row }: typeof vessel.$inferSelect): Vessel {
  return row;
}
