import { doublePrecision, integer, jsonb, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import type { Typed } from '#shared/api/units.ts';

/** Columns that several tables share. Names in the database are snake case by configuration. */

export const id = () => uuid().primaryKey();
/** Raised by every edit of the row's content; the number in its ETag. */
export const version = () => integer().notNull().default(1);
export const instant = () => timestamp({ withTimezone: true });
export const madeAt = () => instant().notNull().defaultNow();
/** Litres, SG, SRM, IBU or °C: one unit each, so that nothing is rounded on the way in or out. */
export const quantity = () => doublePrecision();
export const note = () => text().notNull().default('');
/** What was typed into the quantity fields, beside the stored numbers. */
export const typedTexts = () => jsonb().$type<Typed>().notNull().default({});
