import { z } from 'zod';
import { VERDICTS } from '../rules/vocabulary.ts';
import * as f from './fields.ts';

export const LONGEST_COMMENT = 2000;

const text = f.note.min(1, 'Write something first');

/** What a comment speaks of: the chain, a link of it (named by its later batch) or a batch. */
export const commentAbout = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('chain') }),
  z.strictObject({ kind: z.literal('link'), batchId: f.id }),
  z.strictObject({ kind: z.literal('batch'), batchId: f.id }),
]);
export type CommentAbout = z.infer<typeof commentAbout>;

/** What a link said when the comment was written. */
export const saidVerdict = z.strictObject({
  verdict: z.enum(VERDICTS),
  findings: z.number().int().min(0),
  /** Title of the worst finding; empty on a pour. */
  reason: z.string(),
});
export type SaidVerdict = z.infer<typeof saidVerdict>;

export const comment = z.strictObject({
  id: f.id,
  version: f.version,
  /** The order in which they were written. */
  seq: z.number().int().min(0),
  about: commentAbout,
  /** Of a comment on a link; else null. */
  said: saidVerdict.nullable(),
  by: z.strictObject({ personId: f.id, name: z.string(), initials: z.string() }),
  /** Null: it was removed. */
  text: z.string().nullable(),
  at: z.iso.datetime(),
  editedAt: z.iso.datetime().nullable(),
});
export type Comment = z.infer<typeof comment>;

/** The talk of a chain, oldest first. */
export const talk = z.strictObject({
  comments: z.array(comment),
  /** Of others, since one last looked. */
  unread: z.number().int().min(0),
  /** The last comment that was seen, by its `seq`; 0: none. */
  seen: z.number().int().min(0),
});
export type Talk = z.infer<typeof talk>;

export const commentCreate = z.strictObject({ id: f.id, about: commentAbout, text });
export type CommentCreate = z.infer<typeof commentCreate>;

/** Other words, or a removed comment put back. */
export const commentPatch = z.union([
  z.strictObject({ text }),
  z.strictObject({ removed: z.literal(false) }),
]);
export type CommentPatch = z.infer<typeof commentPatch>;

export const seenRequest = z.strictObject({
  seq: z
    .number()
    .int()
    .min(0)
    .max(2 ** 53 - 1),
});
