/** Kilograms in an avoirdupois pound, exact (international yard and pound agreement, 1959). */
export const KG_PER_POUND = 0.45359237;
export const KG_PER_OUNCE = KG_PER_POUND / 16;

export const poundsFromKg = (kg: number): number => kg / KG_PER_POUND;
export const kgFromPounds = (pounds: number): number => pounds * KG_PER_POUND;
