import { z } from 'zod';
import * as f from './fields.ts';
import { EVENT_KINDS } from './reading.ts';

const at = z.iso.datetime();

/**
 * What is to be done and does not stand on the board. The list itself is made of this and of the
 * board by `shared/today`.
 */
export const todayFacts = z.strictObject({
  /** The server's clock, by which a device measures its own. */
  now: at,
  /** Leave to pour that was asked for and not answered. */
  overrides: z.array(
    z.strictObject({
      id: f.id,
      batchId: f.id,
      askedBy: z.string(),
      askedAt: at,
      holds: z.string(),
    }),
  ),
  /** Pours in hand. */
  runs: z.array(z.strictObject({ batchId: f.id, heldBy: z.string(), openedAt: at })),
  /** Pours without leave that nobody has signed for. */
  unsigned: z.array(z.strictObject({ batchId: f.id, at })),
  /** Additions and takings of yeast of fermenting batches, planned or done. */
  events: z.array(
    z.strictObject({
      id: f.id,
      batchId: f.id,
      kind: z.enum(EVENT_KINDS),
      plannedOn: f.day.nullable(),
      isDone: z.boolean(),
      text: z.string(),
    }),
  ),
  /** Parts of cakes that are to go into a jar. */
  jars: z.array(
    z.strictObject({
      id: f.id,
      batchId: f.id,
      day: f.day,
      volumeL: z.number().nullable(),
      generation: z.number().int(),
    }),
  ),
});
export type TodayFacts = z.infer<typeof todayFacts>;
