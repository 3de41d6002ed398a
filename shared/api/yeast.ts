import { z } from 'zod';
import { YEAST_KINDS } from '../rules/vocabulary.ts';
import * as f from './fields.ts';
import { typed } from './units.ts';

const facts = {
  name: f.name,
  kind: z.enum(YEAST_KINDS),
  /** Marked character: one tastes this yeast. */
  character: z.boolean(),
  fermentMinC: f.celsius.nullable(),
  fermentMaxC: f.celsius.nullable(),
  pourMinC: f.celsius.nullable(),
  pourMaxC: f.celsius.nullable(),
  neverAboveC: f.celsius.nullable(),
  generationLimit: z.number().int().min(1).max(30).nullable(),
  /** Apparent attenuation, 0.3 to 1.05 (share). */
  attenuation: z.number().min(0.3).max(1.05).nullable(),
  /** Usual price of a pack, minor units. */
  packPrice: f.moneyMinor.nullable(),
  notes: f.note,
  typed,
};

export const yeast = z.strictObject({ id: f.id, version: f.version, ...facts });
export type Yeast = z.infer<typeof yeast>;

const inOrder =
  (min: string, max: string) =>
  (value: Record<string, unknown>, ctx: z.core.$RefinementCtx<unknown>) => {
    const low = value[min];
    const high = value[max];
    if ((low === null) !== (high === null) && low !== undefined && high !== undefined)
      ctx.addIssue({ code: 'custom', path: [low === null ? min : max], message: 'Give both ends' });
    if (typeof low === 'number' && typeof high === 'number' && low > high)
      ctx.addIssue({ code: 'custom', path: [max], message: 'Must not be below the lower end' });
  };
const ranges = (value: Record<string, unknown>, ctx: z.core.$RefinementCtx<unknown>) => {
  inOrder('fermentMinC', 'fermentMaxC')(value, ctx);
  inOrder('pourMinC', 'pourMaxC')(value, ctx);
};

export const yeastCreate = z.strictObject({ id: f.id, ...facts }).superRefine(ranges);
export type YeastCreate = z.infer<typeof yeastCreate>;
export const yeastPatch = z.strictObject(facts).partial().superRefine(ranges);
export type YeastPatch = z.infer<typeof yeastPatch>;
