import type { YeastCreate } from '#shared/api/yeast.ts';
import type { VesselCreate } from '#shared/api/vessel.ts';

/** Invented yeasts and vessels. */
export type YeastKey = 'harbour' | 'lantern' | 'ropewalk';
export type VesselKey = 'bucket' | 'conical' | 'carboy' | 'spare';

const ale = {
  kind: 'ale',
  character: false,
  neverAboveC: null,
  generationLimit: 7,
  typed: {},
} as const;

export const DEMO_YEASTS: Record<YeastKey, Omit<YeastCreate, 'id'>> = {
  harbour: {
    ...ale,
    name: 'Harbour ale',
    fermentMinC: 18,
    fermentMaxC: 22,
    pourMinC: 18,
    pourMaxC: 22,
    attenuation: 0.75,
    packPrice: 1400,
    notes: 'Clean, settles well. Our house yeast.',
  },
  lantern: {
    ...ale,
    kind: 'lager',
    name: 'Lantern lager',
    fermentMinC: 9,
    fermentMaxC: 14,
    pourMinC: 10,
    pourMaxC: 14,
    attenuation: 0.75,
    packPrice: 1640,
    notes: 'Slow and clean; give it four weeks.',
  },
  ropewalk: {
    ...ale,
    name: 'Ropewalk stout',
    fermentMinC: 18,
    fermentMaxC: 21,
    pourMinC: 18,
    pourMaxC: 21,
    attenuation: 0.74,
    packPrice: 1100,
    notes: 'Dry finish.',
  },
};

const plain = { minC: null, maxC: null, cleanedOn: null, notes: '', typed: {} } as const;

export const DEMO_VESSELS: Record<VesselKey, Omit<VesselCreate, 'id'>> = {
  bucket: { ...plain, name: 'Garage bucket', shape: 'bucket', capacityL: 32, blowOff: false },
  conical: {
    ...plain,
    name: 'Cellar cone',
    shape: 'conical',
    capacityL: 35,
    blowOff: true,
    minC: 2,
    maxC: 25,
  },
  carboy: { ...plain, name: 'Stairwell carboy', shape: 'carboy', capacityL: 34, blowOff: true },
  spare: { ...plain, name: 'Spare bucket', shape: 'bucket', capacityL: 33, blowOff: false },
};
