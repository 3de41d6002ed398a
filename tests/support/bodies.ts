import { randomUUID } from 'node:crypto';
import type { BatchCreate } from '#shared/api/batch.ts';
import type { ChainCreate } from '#shared/api/chain.ts';
import type { VesselCreate } from '#shared/api/vessel.ts';
import type { YeastCreate } from '#shared/api/yeast.ts';

/** Bodies of creates as the pages would send them; a test says only what it is about. */

export const aYeast = (change: Partial<YeastCreate> = {}): YeastCreate => ({
  id: randomUUID(),
  name: 'Harbour ale',
  kind: 'ale',
  character: false,
  fermentMinC: 18,
  fermentMaxC: 22,
  pourMinC: 18,
  pourMaxC: 22,
  neverAboveC: null,
  generationLimit: 7,
  attenuation: 0.75,
  packPrice: 1400,
  notes: '',
  typed: {},
  ...change,
});

export const aVessel = (change: Partial<VesselCreate> = {}): VesselCreate => ({
  id: randomUUID(),
  name: 'Bucket',
  shape: 'bucket',
  capacityL: 32,
  blowOff: false,
  minC: null,
  maxC: null,
  cleanedOn: null,
  notes: '',
  typed: {},
  ...change,
});

export const aChain = (yeastId: string, change: Partial<ChainCreate> = {}): ChainCreate => ({
  id: randomUUID(),
  name: 'Harbour shelf',
  yeastId,
  vesselId: null,
  start: { kind: 'pack', price: 1400 },
  ...change,
});

export const aBatch = (change: Partial<BatchCreate> = {}): BatchCreate => ({
  id: randomUUID(),
  name: 'Blonde',
  style: 'Blonde ale',
  volumeL: 23,
  og: 1.044,
  fg: 1.011,
  srm: 4,
  ibu: 20,
  fermentC: 20,
  daysUnderBeer: 14,
  brewOn: null,
  wantedOn: null,
  dryHops: [],
  additions: [],
  allergens: ['gluten'],
  cultures: [],
  trub: 'some',
  vesselId: null,
  yeastId: null,
  notes: '',
  typed: {},
  ...change,
});
