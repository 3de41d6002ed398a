/** The closed sets of the trade that the rules, the contracts and the forms share. */

export const VERDICTS = ['pour', 'mind', 'hold'] as const;
export type Verdict = (typeof VERDICTS)[number];

export const YEAST_KINDS = ['ale', 'lager'] as const;
export type YeastKind = (typeof YEAST_KINDS)[number];

export const CULTURES = ['bacteria', 'brettanomyces', 'diastatic', 'enzyme', 'other'] as const;
export type Culture = (typeof CULTURES)[number];

export const HOP_CONTAINMENTS = ['loose', 'bagged'] as const;
export type HopContainment = (typeof HOP_CONTAINMENTS)[number];

/** Whether a thing went in before the yeast was taken (`on-cake`) or after it. */
export const TIMINGS = ['on-cake', 'after-taking'] as const;
export type Timing = (typeof TIMINGS)[number];

export const ADDITION_KINDS = [
  'fruit',
  'spice',
  'coffee',
  'vanilla',
  'wood',
  'lactose',
  'smoke',
  'chilli',
  'stabiliser',
  'other',
] as const;
export type AdditionKind = (typeof ADDITION_KINDS)[number];

/** The fourteen groups of Regulation (EU) 1169/2011, Annex II. */
export const ALLERGENS = [
  'gluten',
  'crustaceans',
  'egg',
  'fish',
  'peanut',
  'soy',
  'milk',
  'tree-nuts',
  'celery',
  'mustard',
  'sesame',
  'sulphites',
  'lupin',
  'molluscs',
] as const;
export type Allergen = (typeof ALLERGENS)[number];

export const TRUB_LEVELS = ['little', 'some', 'much'] as const;
export type TrubLevel = (typeof TRUB_LEVELS)[number];

export const RULE_IDS = [
  'same-yeast',
  'light-to-dark',
  'mild-to-bitter',
  'hops-in-cake',
  'gravity-jump',
  'strong-before-weak',
  'tired-cake',
  'fermentation-temperature',
  'generation',
  'brew-day',
  'cake-wait',
  'time-under-beer',
  'pitch-amount',
  'headspace',
  'wild-culture',
  'allergen',
  'flavour-left',
  'stopped-yeast',
  'unwashed-vessel',
  'cake-check',
] as const;
export type RuleId = (typeof RULE_IDS)[number];

/** A calendar day, `YYYY-MM-DD`. Days never carry a time zone. */
export type Day = string;
