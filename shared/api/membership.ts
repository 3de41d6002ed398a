import { z } from 'zod';
import * as f from './fields.ts';
import { role } from './people.ts';

/** Another brewery for somebody who is signed in; they become its head brewer. */
export const breweryCreate = z.strictObject({
  id: f.id,
  name: f.name,
  timeZone: z.string().max(60).optional(),
});
export type BreweryCreate = z.infer<typeof breweryCreate>;

export const roleChange = z.strictObject({ role });
export type RoleChange = z.infer<typeof roleChange>;

/** Makes somebody head brewer; null: whoever hands over stays one too. */
export const handOver = z.strictObject({ stepDownTo: z.enum(['brewer', 'taster']).nullable() });
export type HandOver = z.infer<typeof handOver>;
