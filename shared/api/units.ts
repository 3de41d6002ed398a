import { z } from 'zod';

export const unitPrefs = z.strictObject({
  system: z.enum(['metric', 'us']),
  gravity: z.enum(['sg', 'plato']),
  colour: z.enum(['srm', 'ebc']),
  temperature: z.enum(['c', 'f']),
});
export type UnitPrefs = z.infer<typeof unitPrefs>;

export const theme = z.enum(['light', 'dark', 'system']);
export type Theme = z.infer<typeof theme>;

/**
 * What a person typed into a quantity field, kept beside the stored number so that the field reads
 * as it was typed. `unit` is the unit the field showed (`L`, `gal`, `SG`, `°P`, `SRM`, `EBC`, …).
 */
export const typedText = z.strictObject({ text: z.string().max(40), unit: z.string().max(12) });
export type TypedText = z.infer<typeof typedText>;
export const typed = z.record(z.string().max(40), typedText);
export type Typed = z.infer<typeof typed>;
