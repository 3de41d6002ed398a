/** The closed set of what the pour check can find. */
export const POUR_RULES = [
  'kills-yeast',
  'no-reading',
  'too-warm',
  'too-cold',
  'warmer-cake',
] as const;
export type PourRule = (typeof POUR_RULES)[number];

/** Holds that nobody can override: dead yeast, and a temperature that nobody has read. */
export const NEVER_OVERRIDDEN: readonly PourRule[] = ['kills-yeast', 'no-reading'];
