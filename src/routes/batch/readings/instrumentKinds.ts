import type { InstrumentKind } from '#shared/api/reading.ts';

/** What an instrument is called, and the scale that it shows. */
export const KINDS: Record<InstrumentKind, { label: string; unit: string }> = {
  hydrometer: { label: 'Hydrometer', unit: 'SG' },
  refractometer: { label: 'Refractometer', unit: '°Bx' },
  thermometer: { label: 'Thermometer', unit: '°C' },
  'ph-meter': { label: 'pH meter', unit: 'pH' },
};
