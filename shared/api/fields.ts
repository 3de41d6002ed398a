import { z } from 'zod';

/** Fields that several contracts share. Every number is in the one stored unit. */

/** Written small, so that one id is always one text. */
export const id = z.uuid().toLowerCase();
export const slug = z.string().regex(/^[a-z0-9][a-z0-9-]{1,79}$/);

/** A calendar day that exists, `YYYY-MM-DD`, 1900 to 2199. */
export const day = z
  .string()
  .regex(/^(19|20|21)\d\d-\d\d-\d\d$/, 'Write the day as YYYY-MM-DD')
  .refine((text) => {
    const at = new Date(`${text}T00:00:00Z`);
    return !Number.isNaN(at.getTime()) && at.toISOString().slice(0, 10) === text;
  }, 'There is no such day');

/** A name as people write it: trimmed, 1 to 60 characters, no control characters. */
export const name = z
  .string()
  .trim()
  .min(1, 'Write a name')
  .max(60, 'Use at most 60 characters')
  // oxlint-disable-next-line no-control-regex -- which are what is looked for
  .regex(/^[^\u0000-\u001f\u007f-\u009f]*$/, 'Leave out control characters')
  .normalize('NFC');

export const note = z
  .string()
  .trim()
  .max(2000, 'Use at most 2000 characters')
  // oxlint-disable-next-line no-control-regex -- a NUL cannot be stored as text
  .regex(/^[^\u0000]*$/, 'Leave out control characters');

const between = (min: number, max: number, what: string) =>
  z.number({ error: 'Write a number' }).min(min, what).max(max, what);

export const volumeL = between(0.5, 5000, 'Between 0.5 and 5000 litres');
/** A part of a volume may be nothing at all. */
export const partL = between(0, 5000, 'Between 0 and 5000 litres');
export const originalGravity = between(1, 1.2, 'Between 1.000 and 1.200');
export const finalGravity = between(0.985, 1.2, 'Between 0.985 and the original gravity');
export const srm = between(0, 100, 'Between 0 and 100 SRM');
export const ibu = between(0, 200, 'Between 0 and 200 IBU');
export const celsius = between(-5, 110, 'Between −5 and 110 °C');
export const days = z
  .number({ error: 'Write a number' })
  .int('Write whole days')
  .min(1, 'Between 1 and 400 days')
  .max(400, 'Between 1 and 400 days');
export const gramsPerLitre = between(0, 50, 'Between 0 and 50 g/L');
export const moneyMinor = z.number().int().min(0).max(100_000_000);
export const version = z.number().int().min(1);
