/**
 * Density of water, kg/m³, at 0–150 °C and 1 atm. Kell 1975, J. Chem. Eng. Data 20:97–105; within
 * 0.003 kg/m³ of Tanaka et al. 2001 (Metrologia 38:301) up to 40 °C. Throws a RangeError outside.
 */
export function waterDensity(celsius: number): number {
  if (!(celsius >= 0 && celsius <= 150))
    throw new RangeError(`Density of water is known from 0 to 150 °C, not at ${celsius}`);
  const t = celsius;
  const above =
    999.83952 +
    t *
      (16.945176 +
        t * (-7.9870401e-3 + t * (-46.170461e-6 + t * (105.56302e-9 - t * 280.54253e-12))));
  return above / (1 + 16.87985e-3 * t);
}

/** Above this the sample must be cooled first: wort no longer expands as water does. */
export const HYDROMETER_MAX_C = 40;

/**
 * SG at the hydrometer's own temperature from a reading in a warmer or colder sample, both in °C.
 * First order: wort is taken to expand like water, and the glass not at all. Range 0–40 °C; throws a
 * RangeError for a sample outside it.
 */
export function correctedSg(reading: number, sampleC: number, calibratedC = 20): number {
  if (!(sampleC >= 0 && sampleC <= HYDROMETER_MAX_C))
    throw new RangeError(`A hydrometer is read between 0 and ${HYDROMETER_MAX_C} °C`);
  return (reading * waterDensity(calibratedC)) / waterDensity(sampleC);
}
