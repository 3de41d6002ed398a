import type { pourClearance, pourEvent, pourReading, pourRun } from '../../db/schema/pour.ts';

export type RunRow = typeof pourRun.$inferSelect;
export type ReadingRow = typeof pourReading.$inferSelect;
export type ClearanceRow = typeof pourClearance.$inferSelect;
export type EventRow = typeof pourEvent.$inferSelect;

/** A run with all that belongs to it, as the rows are. */
export interface RunRows {
  run: RunRow;
  /** By the device's clock, which is nearly their own order. */
  readings: ReadingRow[];
  clearances: ClearanceRow[];
  pour: EventRow | null;
}
