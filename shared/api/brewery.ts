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
  /** When the season is meant to begin and to end; null: left open. */
  firstDay: f.day.nullable(),
  lastDay: f.day.nullable(),
  /** Put away: it is read, and nothing on it is changed. */
  isArchived: z.boolean(),
});
export type Season = z.infer<typeof season>;

export const daysInOrder = (
  { firstDay, lastDay }: { firstDay?: string | null; lastDay?: string | null },
  ctx: z.core.$RefinementCtx<unknown>,
) => {
  if (firstDay && lastDay && lastDay < firstDay)
    ctx.addIssue({
      code: 'custom',
      path: ['lastDay'],
      message: 'The last day cannot be before the first',
    });
};

/** What a person writes of a season. */
const seasonFields = {
  name: f.name,
  firstDay: f.day.nullable(),
  lastDay: f.day.nullable(),
  brewWeekdays: z.array(weekday).max(7),
  brewsPerDay: z.number().int().min(1).max(20),
};

export const seasonPatch = z
  .strictObject({ ...seasonFields, blockedDays: z.array(f.day).max(400) })
  .partial()
  .superRefine(daysInOrder);
export type SeasonPatch = z.infer<typeof seasonPatch>;

/** What goes from one season into a new one, all of it pencilled. */
export const seasonCopy = z.strictObject({
  seasonId: f.id,
  /** Shelves that are copied. */
  chainIds: z.array(f.id).max(300),
  /** Whether what lies on the bench is copied too. */
  bench: z.boolean(),
  /** Batches that were brewed already: left out, or pencilled to be brewed again. */
  brewed: z.enum(['left-out', 'pencilled']),
  /** So many days later, or so that the first brew day falls on this one. */
  dates: z.union([
    z.strictObject({ shiftDays: z.number().int().min(-3700).max(3700) }),
    z.strictObject({ startOn: f.day }),
  ]),
});
export type SeasonCopy = z.infer<typeof seasonCopy>;

export const seasonCreate = z
  .strictObject({ id: f.id, ...seasonFields, copy: seasonCopy.nullable() })
  .superRefine(daysInOrder);
export type SeasonCreate = z.infer<typeof seasonCreate>;

/** A season in the list of all of a brewery's. */
export const listedSeason = z.strictObject({
  ...season.omit({ blockedDays: true, revision: true }).shape,
  /** The one that the brewery's own address shows. */
  isCurrent: z.boolean(),
  chains: z.number().int().min(0),
  batches: z.number().int().min(0),
});
export type ListedSeason = z.infer<typeof listedSeason>;
