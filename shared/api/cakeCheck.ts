import { z } from 'zod';
import * as f from './fields.ts';
import { typed } from './units.ts';

/** What may be wrong with the beer above a cake, in the trade's words. */
export const FAULTS = [
  'sour',
  'vinegar',
  'butter',
  'smoke-plastic',
  'solvent',
  'sulphur',
  'green-apple',
  'meaty',
  'papery',
  'musty',
] as const;
export const LAYERS = ['one', 'trub-on-top', 'trub-below', 'mixed'] as const;
export const CAKE_COLOURS = ['cream', 'tan', 'green-flecks', 'brown', 'grey'] as const;
export const SMELLS = [
  'bread',
  'fruit',
  'hops',
  'butter',
  'sulphur',
  'vinegar',
  'smoke-plastic',
  'meaty',
] as const;
export const JUDGEMENTS = ['fit', 'with-care', 'unfit'] as const;
export type Judgement = (typeof JUDGEMENTS)[number];

const whole = (max: number) =>
  z
    .number({ error: 'Write a number' })
    .int('Write a whole number')
    .min(0, 'Not below nothing')
    .max(max, `At most ${max}`);

/** A count in an improved Neubauer chamber: cells in some of its 25 squares of 0.2 mm. */
export const cellCount = z
  .strictObject({
    living: whole(100_000),
    dead: whole(100_000),
    squares: whole(25).min(1, 'At least one square'),
    /** How many times the sample was thinned: 100 means 1 in 100. */
    dilution: z
      .number({ error: 'Write a number' })
      .min(1, 'Write 1 for an undiluted sample')
      .max(1_000_000, 'At most 1,000,000 times'),
  })
  .refine((count) => count.living + count.dead > 0, {
    path: ['living'],
    message: 'Count at least one cell',
  });
export type CellCount = z.infer<typeof cellCount>;

const kilograms = z
  .number({ error: 'Write a number' })
  .min(0, 'Between 0 and 5000 kg')
  .max(5000, 'Between 0 and 5000 kg');

const fields = {
  /** The beer above it, tasted before anything else. */
  tasted: z.enum(['clean', 'off'], { error: 'Taste the beer first, and say how it was' }),
  faults: z.array(z.enum(FAULTS)).max(FAULTS.length),
  /** The cake by its volume; null: not measured so. */
  volumeL: f.partL.nullable(),
  massKg: kilograms.nullable(),
  /** The vessel with the cake in it, and empty; both or neither. */
  fullKg: kilograms.nullable(),
  tareKg: kilograms.nullable(),
  layers: z.enum(LAYERS).nullable(),
  colour: z.enum(CAKE_COLOURS).nullable(),
  smells: z.array(z.enum(SMELLS)).max(SMELLS.length),
  count: cellCount.nullable(),
  judged: z.enum(JUDGEMENTS, { error: 'Say whether it is fit' }),
  notes: f.note,
  typed,
};

const fits = (value: z.infer<z.ZodObject<typeof fields>>, ctx: z.core.$RefinementCtx<unknown>) => {
  const say = (path: string, message: string) =>
    ctx.addIssue({ code: 'custom', path: [path], message });
  if ((value.fullKg === null) !== (value.tareKg === null))
    say(value.fullKg === null ? 'fullKg' : 'tareKg', 'Weigh the vessel full and empty, or neither');
  if (value.fullKg !== null && value.tareKg !== null && value.fullKg <= value.tareKg)
    say('fullKg', 'The vessel with the cake must weigh more than the empty one');
  if (value.massKg !== null && value.fullKg !== null)
    say('massKg', 'Give the mass of the cake or the weight of the vessel, not both');
  if (value.tasted === 'clean' && value.faults.length > 0)
    say('faults', 'Say “off”, or leave the faults out');
  if (value.tasted === 'off' && value.judged === 'fit')
    say('judged', 'A cake under beer that tastes off is not fit');
};

/** The whole judgement, written at once: a second look replaces the first. */
export const cakeCheckWrite = z.strictObject(fields).superRefine(fits);
export type CakeCheckWrite = z.infer<typeof cakeCheckWrite>;

export const cakeCheck = z.strictObject({
  ...fields,
  batchId: f.id,
  version: f.version,
  signedBy: z.strictObject({ personId: f.id, name: z.string() }),
  signedAt: z.iso.datetime(),
});
export type CakeCheck = z.infer<typeof cakeCheck>;
