import { z } from 'zod';
import * as f from './fields.ts';
import { typed } from './units.ts';

export const VESSEL_SHAPES = ['bucket', 'carboy', 'conical', 'keg'] as const;
export type VesselShape = (typeof VESSEL_SHAPES)[number];

const facts = {
  name: f.name,
  shape: z.enum(VESSEL_SHAPES),
  capacityL: f.volumeL,
  /** A blow-off tube is fitted. */
  blowOff: z.boolean(),
  /** Temperatures that it can hold. */
  minC: f.celsius.nullable(),
  maxC: f.celsius.nullable(),
  cleanedOn: f.day.nullable(),
  notes: f.note,
  typed,
};

export const vessel = z.strictObject({ id: f.id, version: f.version, ...facts });
export type Vessel = z.infer<typeof vessel>;
export const vesselCreate = z.strictObject({ id: f.id, ...facts });
export type VesselCreate = z.infer<typeof vesselCreate>;
export const vesselPatch = z.strictObject(facts).partial();
export type VesselPatch = z.infer<typeof vesselPatch>;
