import { z } from 'zod';
import { VERDICTS } from '../rules/vocabulary.ts';
import * as f from './fields.ts';
import { typed } from './units.ts';

/**
 * A pour run: one brew day's way from the finished beer to the poured wort, for one link. It is held
 * by one person; others see it live. Ids come from the client, so that a command whose answer was
 * lost is sent again and done once.
 */
export const POUR_STEPS = ['racked', 'cake', 'keep', 'clean', 'wort', 'after'] as const;
export const pourStep = z.enum(POUR_STEPS);
export type PourStep = z.infer<typeof pourStep>;

/** What the steps found: only what is not kept elsewhere. */
export const pourFound = z.strictObject({
  /** Where the rest of the cake goes. */
  rest: z.enum(['jar', 'dumped']).nullable().optional(),
  cleaned: z.boolean().optional(),
  sanitised: z.boolean().optional(),
  /** Temperature of the cooling water, or of the room. */
  coolantC: f.celsius.nullable().optional(),
  aerated: z.boolean().optional(),
  lidOn: z.boolean().optional(),
});
export type PourFound = z.infer<typeof pourFound>;

const moment = z.iso.datetime({ offset: true });

/** A week: no clock that is read is further off. */
const MOST_OFFSET_MS = 7 * 24 * 60 * 60 * 1000;

/** When it was by the device's clock, and the server's clock less that one, as the device measured it. */
const byDevice = {
  deviceAt: moment,
  clockOffsetMs: z.number().int().min(-MOST_OFFSET_MS).max(MOST_OFFSET_MS),
};

const ofRun = { runId: f.id };

export const pourOpening = z.strictObject({ id: f.id });
export const pourStepRequest = z.strictObject({ ...ofRun, step: pourStep, found: pourFound });
export type PourStepRequest = z.infer<typeof pourStepRequest>;
export const wortReadingRequest = z.strictObject({
  ...ofRun,
  id: f.id,
  c: f.celsius,
  typed,
  ...byDevice,
});
export type WortReadingRequest = z.infer<typeof wortReadingRequest>;
export const withdrawalRequest = z.strictObject({ ...ofRun, readingId: f.id });
export const runRequest = z.strictObject(ofRun);

const reason = f.note.min(3, 'Write why, in a few words');

/** Leave to pour where something holds. A head brewer who asks gives the reason at once. */
export const overrideRequest = z.strictObject({ ...ofRun, id: f.id, reason: reason.nullable() });
export type OverrideRequest = z.infer<typeof overrideRequest>;
export const overrideAnswer = z.strictObject({
  ...ofRun,
  clearanceId: f.id,
  answer: z.enum(['granted', 'refused']),
  reason,
});
export type OverrideAnswer = z.infer<typeof overrideAnswer>;

/** That the wort was poured: recorded whatever was said before. */
export const pourRequest = z.strictObject({
  ...ofRun,
  id: f.id,
  ...byDevice,
  volumeL: f.volumeL.nullable(),
  og: f.originalGravity.nullable(),
  typed,
  /** What is left of the cake; null: nothing. */
  surplus: z
    .strictObject({ id: f.id, what: z.enum(['jar', 'dumped']), volumeL: f.partL.nullable() })
    .nullable(),
});
export type PourRequest = z.infer<typeof pourRequest>;
export const signatureRequest = z.strictObject({ ...ofRun, reason });

const who = z.strictObject({ personId: f.id, name: z.string() });
export type PourPerson = z.infer<typeof who>;
const at = z.iso.datetime();

/** `at` is the moment itself: the device's clock put right, never later than its arrival. */
const timed = { at, deviceAt: at, clockOffsetMs: z.number().int(), arrivedAt: at, by: who };

export const wortReading = z.strictObject({
  id: f.id,
  c: z.number(),
  typed,
  ...timed,
  /** Taken back as a mistake: it counts for nothing. */
  withdrawn: z.boolean(),
});
export type WortReading = z.infer<typeof wortReading>;

/** Something that speaks against the pour: of its temperature, or of the link itself. */
export const pourObjection = z.strictObject({
  rule: z.string(),
  verdict: z.enum(['mind', 'hold']),
  title: z.string(),
  because: z.string(),
});
export type PourObjection = z.infer<typeof pourObjection>;

export const pourClearance = z.strictObject({
  id: f.id,
  kind: z.enum(['reading', 'override']),
  readingId: f.id.nullable(),
  askedBy: who,
  askedAt: at,
  findings: z.array(pourObjection),
  /** Null: still asked. */
  answer: z.enum(['granted', 'refused']).nullable(),
  answeredBy: who.nullable(),
  answeredAt: at.nullable(),
  reason: z.string(),
  expiresAt: at.nullable(),
});
export type PourClearance = z.infer<typeof pourClearance>;

export const pourRecord = z.strictObject({
  id: f.id,
  ...timed,
  volumeL: z.number().nullable(),
  og: z.number().nullable(),
  readingC: z.number().nullable(),
  verdict: z.enum(VERDICTS),
  findings: z.array(pourObjection),
  /** There was leave to pour. Else it stays red until a head brewer signs a reason. */
  cleared: z.boolean(),
  signedBy: who.nullable(),
  signedAt: at.nullable(),
  reason: z.string(),
});
export type PourRecord = z.infer<typeof pourRecord>;

export const pourRun = z.strictObject({
  id: f.id,
  batchId: f.id,
  /** Whose cake the wort goes onto. */
  cakeBatchId: f.id.nullable(),
  heldBy: who,
  openedAt: at,
  closedAt: at.nullable(),
  state: z.enum(['open', 'poured', 'left']),
  step: pourStep,
  found: pourFound,
  /** In the order of their own times. */
  readings: z.array(wortReading),
  /** In the order in which they were asked. */
  clearances: z.array(pourClearance),
  pour: pourRecord.nullable(),
});
export type PourRun = z.infer<typeof pourRun>;

/** The newest run of a link, and the server's clock, by which a device measures its own. */
export const pourState = z.strictObject({ run: pourRun.nullable(), now: at });
export type PourState = z.infer<typeof pourState>;
