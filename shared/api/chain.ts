import { z } from 'zod';
import { ALLERGENS, CULTURES } from '../rules/vocabulary.ts';
import * as f from './fields.ts';

/** How the first batch of a chain gets its yeast. */
export const chainStart = z.discriminatedUnion('kind', [
  /** A fresh pack; generation 1. */
  z.strictObject({ kind: z.literal('pack'), price: f.moneyMinor.nullable() }),
  /** Part of the cake of another batch; its generation is one more. How much: that link's `keepL`. */
  z.strictObject({ kind: z.literal('cake'), batchId: f.id }),
  /** Slurry from outside, whose next beer is of this generation. */
  z.strictObject({
    kind: z.literal('outside'),
    generation: z.number().int().min(1).max(60),
    price: f.moneyMinor.nullable(),
    /** What the slurry brings along. Empty: nothing. Null: unknown. */
    allergens: z.array(z.enum(ALLERGENS)).max(14).nullable().default(null),
    cultures: z.array(z.enum(CULTURES)).max(5).nullable().default(null),
  }),
]);
export type ChainStart = z.infer<typeof chainStart>;

export const chain = z.strictObject({
  id: f.id,
  version: f.version,
  name: f.name,
  yeastId: f.id,
  vesselId: f.id.nullable(),
  /** Pack and all that came of it, branches included. */
  lineId: f.id,
  /** Place on the board, from 0. */
  position: z.number().int().min(0),
  start: chainStart,
});
export type Chain = z.infer<typeof chain>;

export const chainCreate = z.strictObject({
  id: f.id,
  name: f.name,
  yeastId: f.id,
  vesselId: f.id.nullable(),
  start: chainStart,
});
export type ChainCreate = z.infer<typeof chainCreate>;

export const chainPatch = z
  .strictObject({
    name: f.name,
    yeastId: f.id,
    vesselId: f.id.nullable(),
    start: chainStart,
    /** Place among the shelves, from 0. */
    position: z.number().int().min(0).max(10_000),
  })
  .partial();
export type ChainPatch = z.infer<typeof chainPatch>;

/** The board's revision once a chain's dates follow its cake. */
export const datesPulled = z.strictObject({ revision: z.number().int().min(0) });
export type DatesPulled = z.infer<typeof datesPulled>;
