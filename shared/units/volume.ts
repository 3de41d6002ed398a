/** Litres in a US liquid gallon: 231 cubic inches, exact (NIST Handbook 44, Appendix C). */
export const LITRES_PER_GALLON = 3.785411784;
export const LITRES_PER_FLUID_OUNCE = LITRES_PER_GALLON / 128;

export const gallonsFromLitres = (litres: number): number => litres / LITRES_PER_GALLON;
export const litresFromGallons = (gallons: number): number => gallons * LITRES_PER_GALLON;
