import type { VesselShape } from '#shared/api/vessel.ts';
import type {
  AdditionKind,
  Allergen,
  Culture,
  HopContainment,
  Timing,
  TrubLevel,
  YeastKind,
} from '#shared/rules/vocabulary.ts';

/** The closed sets of the trade in words, for fields and sentences. */

export const YEAST_KIND_WORDS: Record<YeastKind, string> = { ale: 'Ale', lager: 'Lager' };

export const SHAPE_WORDS: Record<VesselShape, string> = {
  bucket: 'Bucket',
  carboy: 'Carboy',
  conical: 'Conical',
  keg: 'Keg',
};

export const ALLERGEN_WORDS: Record<Allergen, string> = {
  gluten: 'Gluten',
  crustaceans: 'Crustaceans',
  egg: 'Egg',
  fish: 'Fish',
  peanut: 'Peanut',
  soy: 'Soy',
  milk: 'Milk',
  'tree-nuts': 'Tree nuts',
  celery: 'Celery',
  mustard: 'Mustard',
  sesame: 'Sesame',
  sulphites: 'Sulphites',
  lupin: 'Lupin',
  molluscs: 'Molluscs',
};

export const CULTURE_WORDS: Record<Culture, string> = {
  bacteria: 'Souring bacteria',
  brettanomyces: 'Brettanomyces',
  diastatic: 'Diastatic yeast',
  enzyme: 'Added enzyme',
  other: 'Another culture',
};

export const ADDITION_WORDS: Record<AdditionKind, string> = {
  fruit: 'Fruit',
  spice: 'Spice',
  coffee: 'Coffee',
  vanilla: 'Vanilla',
  wood: 'Wood',
  lactose: 'Lactose',
  smoke: 'Smoked malt',
  chilli: 'Chilli',
  stabiliser: 'Metabisulphite or sorbate',
  other: 'Something else',
};

export const HOP_WORDS: Record<HopContainment, string> = { loose: 'Loose', bagged: 'Bagged' };

export const TIMING_WORDS: Record<Timing, string> = {
  'on-cake': 'On the cake',
  'after-taking': 'After the yeast is taken',
};

export const TRUB_WORDS: Record<TrubLevel, string> = {
  little: 'Little',
  some: 'Some',
  much: 'Much',
};

/** A closed set as the options of a field. */
export const optionsOf = <K extends string>(words: Record<K, string>) =>
  (Object.keys(words) as K[]).map((value) => ({ value, label: words[value] }));
