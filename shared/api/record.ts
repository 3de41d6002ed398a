import { z } from 'zod';
import { VERDICTS } from '../rules/vocabulary.ts';
import * as f from './fields.ts';

const saying = z.strictObject({
  verdict: z.enum(VERDICTS),
  /** Title of the worst finding; null: nothing speaks against it. */
  reason: z.string().nullable(),
});

/** A change as the record tells it. */
export const recordEntry = z.strictObject({
  id: f.id,
  at: z.iso.datetime(),
  /** The day in the brewery's time zone, under which it stands. */
  day: f.day,
  person: z.strictObject({ id: f.id, name: z.string() }),
  kind: z.enum(['move', 'edit', 'undo', 'redo']),
  /** "Set the bitterness of Keel from 24 to 28 IBU". */
  what: z.string(),
  /** Each fact that changed; empty where the sentence says all. */
  facts: z.array(
    z.strictObject({
      label: z.string(),
      from: z.string().nullable(),
      to: z.string().nullable(),
    }),
  ),
  /** What links said before and after it: of a move its own, of an edit those that changed. */
  links: z.array(
    z.strictObject({
      batchId: f.id,
      name: z.string(),
      from: saying.nullable(),
      to: saying.nullable(),
    }),
  ),
  /** Rows that it is about, the first one first; some may be gone. */
  touches: z.array(f.id),
  /** It was undone, and not redone. */
  undone: z.boolean(),
});
export type RecordEntry = z.infer<typeof recordEntry>;

export const recordPage = z.strictObject({
  /** Newest first. */
  changes: z.array(recordEntry),
  /** Give it as `before` for older ones; null: these were the oldest. */
  next: z.string().nullable(),
});
export type RecordPage = z.infer<typeof recordPage>;

/** Which changes are asked for. Days are the brewery's, both included. */
export const recordQuery = z.object({
  person: f.id.optional(),
  batch: f.id.optional(),
  chain: f.id.optional(),
  from: f.day.optional(),
  to: f.day.optional(),
  before: z
    .string()
    .regex(/^\d{1,15}$/, 'This is no mark of a page')
    .optional(),
});
export type RecordQuery = z.infer<typeof recordQuery>;
