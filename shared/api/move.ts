import { z } from 'zod';
import { batch } from './batch.ts';
import { chain, chainCreate } from './chain.ts';
import * as f from './fields.ts';

/**
 * The wish to move one batch: after which batch, of which chain. `null` after: first there.
 * `new`: a new shelf, made by the same move; `newChain` says which.
 */
export const moveRequest = z
  .strictObject({
    /** Made by the client, so that a repeated request moves once. */
    id: f.id,
    batchId: f.id,
    toChainId: z.union([f.id, z.literal('bench'), z.literal('new')]),
    afterBatchId: f.id.nullable(),
    /** Where the mover saw the batch: a chain, or null for the bench. */
    expectedChainId: f.id.nullable(),
    /** `pull`: dates follow the cake; `keep`: every date stays. */
    dates: z.enum(['pull', 'keep']),
    newChain: chainCreate.optional(),
  })
  .refine((m) => (m.toChainId === 'new') === (m.newChain !== undefined), {
    path: ['newChain'],
    message: 'Say which chain to make, and only for a new shelf',
  });
export type MoveRequest = z.infer<typeof moveRequest>;

/** Undo or redo of the change that the person saw, so that a repeated request does it once. */
export const undoRequest = z.strictObject({ changeId: f.id });
export type UndoRequest = z.infer<typeof undoRequest>;

export const shiftedDate = z.strictObject({
  batchId: f.id,
  from: f.day.nullable(),
  to: f.day.nullable(),
});
export type ShiftedDate = z.infer<typeof shiftedDate>;

/** What a move, an undo or a redo did. Rows that did not change are not in it. */
export const moved = z.strictObject({
  changeId: f.id,
  /** "Moved Chandler after Slack Water". */
  what: z.string(),
  revision: z.number().int(),
  batches: z.array(batch),
  chains: z.array(chain),
  removedChainIds: z.array(f.id),
  shifted: z.array(shiftedDate),
  /** Batches whose kept part or acceptance went with the link that was broken. */
  cleared: z.array(f.id),
  undo: z.strictObject({ id: f.id, what: z.string() }).nullable(),
  redo: z.strictObject({ id: f.id, what: z.string() }).nullable(),
});
export type Moved = z.infer<typeof moved>;
