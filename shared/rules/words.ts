import type { AdditionKind, Allergen, Culture } from './vocabulary.ts';

/** The closed sets as they read within a sentence. */
export const ALLERGEN_WORDS: Record<Allergen, string> = {
  gluten: 'gluten',
  crustaceans: 'crustaceans',
  egg: 'egg',
  fish: 'fish',
  peanut: 'peanut',
  soy: 'soy',
  milk: 'milk',
  'tree-nuts': 'tree nuts',
  celery: 'celery',
  mustard: 'mustard',
  sesame: 'sesame',
  sulphites: 'sulphites',
  lupin: 'lupin',
  molluscs: 'molluscs',
};

export const CULTURE_WORDS: Record<Culture, string> = {
  bacteria: 'bacteria',
  brettanomyces: 'Brettanomyces',
  diastatic: 'diastatic yeast',
  enzyme: 'an added enzyme',
  other: 'another culture',
};

export const ADDITION_WORDS: Record<AdditionKind, string> = {
  fruit: 'fruit',
  spice: 'spice',
  coffee: 'coffee',
  vanilla: 'vanilla',
  wood: 'wood',
  lactose: 'lactose',
  smoke: 'smoke',
  chilli: 'chilli',
  stabiliser: 'a stabiliser',
  other: 'an addition',
};

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
