import type { BatchFacts, PourFacts, YeastFacts } from '#shared/rules/facts.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';

/**
 * The chain of the front page. Its verdicts stand here as fixed words, to keep the engine out of
 * the first load; a test asks the engine and fails if they differ.
 */
export interface ExampleBeer {
  facts: BatchFacts & { name: string; og: number; srm: number; ibu: number; brewOn: string };
  style: string;
  fill: number;
  cake: number;
  pencilled: boolean;
}

export interface ExampleLink {
  verdict: Verdict;
  hops: boolean;
  /** Sentence on a wide page. */
  reason: string;
  /** The same in a few words. */
  short: string;
}

export const EXAMPLE_YEAST: YeastFacts & { name: string } = {
  name: 'Harbour ale',
  kind: 'ale',
  character: false,
  fermentMinC: 18,
  fermentMaxC: 22,
  generationLimit: 7,
};
export const EXAMPLE_VESSEL_L = 32;
export const EXAMPLE_PACK_PRICE = { minor: 1400, currency: 'EUR' } as const;
/** The whole cake goes under the next beer. */
export const EXAMPLE_POUR: PourFacts = {};

const common = {
  volumeL: 23,
  fermentC: 20,
  daysUnderBeer: 14,
  additions: [],
  allergens: ['gluten'],
  cultures: [],
} as const;

export const EXAMPLE_BEERS: readonly ExampleBeer[] = [
  {
    facts: {
      ...common,
      id: 'low-tide-blonde',
      name: 'Low Tide Blonde',
      og: 1.044,
      fg: 1.01,
      srm: 4,
      ibu: 20,
      brewOn: '2027-03-06',
      dryHops: [],
    },
    style: 'Blonde ale',
    fill: 0.8,
    cake: 0.03,
    pencilled: false,
  },
  {
    facts: {
      ...common,
      id: 'jetty-pale',
      name: 'Jetty Pale',
      og: 1.052,
      fg: 1.012,
      srm: 7,
      ibu: 38,
      brewOn: '2027-03-20',
      dryHops: [{ gramsPerLitre: 0.8, contained: 'loose', timing: 'on-cake' }],
    },
    style: 'American pale ale',
    fill: 0.8,
    cake: 0.04,
    pencilled: false,
  },
  {
    facts: {
      ...common,
      id: 'chandler',
      name: 'Chandler',
      og: 1.06,
      fg: 1.015,
      srm: 30,
      ibu: 34,
      brewOn: '2027-04-03',
      dryHops: [],
    },
    style: 'Robust porter',
    fill: 0.8,
    cake: 0.05,
    pencilled: false,
  },
  {
    facts: {
      ...common,
      id: 'spring-tide',
      name: 'Spring Tide',
      og: 1.047,
      fg: 1.011,
      srm: 4,
      ibu: 22,
      brewOn: '2027-04-17',
      dryHops: [],
    },
    style: 'Kölsch-style',
    fill: 0.76,
    cake: 0.035,
    pencilled: true,
  },
];

/** From each beer to the one after it. */
export const EXAMPLE_LINKS: readonly ExampleLink[] = [
  {
    verdict: 'pour',
    hops: false,
    reason: '8 points stronger, a shade darker.',
    short: 'a shade darker',
  },
  {
    verdict: 'mind',
    hops: true,
    reason: 'Hops in the cake. Bag them before they go in.',
    short: 'hops in the cake',
  },
  {
    verdict: 'hold',
    hops: false,
    reason: 'A porter cake would darken a pale beer.',
    short: 'too dark a cake',
  },
];
