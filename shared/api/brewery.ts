import { z } from 'zod';
import * as f from './fields.ts';
import { unitPrefs } from './units.ts';

export const brewery = z.strictObject({
  id: f.id,
  slug: f.slug,
  version: f.version,
  name: f.name,
  /** IANA name; "today" is this zone's. */
  timeZone: z.string().max(60),
  /** ISO 4217. */
  currency: z.string().regex(/^[A-Z]{3}$/),
  /** Units of a new member. */
  units: unitPrefs,
});
export type Brewery = z.infer<typeof brewery>;

export const breweryPatch = z.strictObject({
  name: f.name.optional(),
  timeZone: z.string().max(60).optional(),
  currency: z
    .string()
    .regex(/^[A-Z]{3}$/, 'Write the three letters of the currency, such as EUR')
    .optional(),
  units: unitPrefs.optional(),
});
export type BreweryPatch = z.infer<typeof breweryPatch>;

/** ISO weekday, 1 = Monday … 7 = Sunday. */
export const weekday = z.number().int().min(1).max(7);

export const season = z.strictObject({
  id: f.id,
  version: f.version,
  name: f.name,
  /** Raised by every change of anything on this season's board. */
  revision: z.number().int().min(0),
  brewWeekdays: z.array(weekday).max(7),
  brewsPerDay: z.number().int().min(1).max(20),
  blockedDays: z.array(f.day).max(400),
});
export type Season = z.infer<typeof season>;

export const seasonPatch = z.strictObject({
  name: f.name.optional(),
  brewWeekdays: z.array(weekday).max(7).optional(),
  brewsPerDay: z.number().int().min(1).max(20).optional(),
  blockedDays: z.array(f.day).max(400).optional(),
});
export type SeasonPatch = z.infer<typeof seasonPatch>;
