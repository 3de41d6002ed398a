import type { ChainStart } from '#shared/api/chain.ts';
import type { DemoBatch } from './demoBatch.ts';
import { plan } from './plan.ts';
import type { VesselKey, YeastKey } from './stock.ts';

export interface DemoChain {
  name: string;
  yeast: YeastKey;
  vessel: VesselKey;
  start: Exclude<ChainStart, { kind: 'cake' }>;
  batches: readonly DemoBatch[];
}

const hopped = (of: DemoBatch['plan'], gramsPerLitre: number): DemoBatch['plan'] => ({
  ...of,
  dryHops: [{ gramsPerLitre, contained: 'loose', timing: 'on-cake' }],
});

const pencilled = (of: DemoBatch['plan'], brewDay: number | null): DemoBatch => ({
  plan: of,
  brewDay,
  stage: 'pencilled',
});

export const DEMO_CHAINS: readonly DemoChain[] = [
  {
    name: 'Harbour ale',
    yeast: 'harbour',
    vessel: 'bucket',
    start: { kind: 'pack', price: 1400 },
    batches: [
      {
        plan: plan('Low Tide Blonde', 'Blonde ale', [1.044, 1.011, 4, 20, 19, 14]),
        brewDay: 0,
        stage: 'racked',
        read: { volumeL: 23, og: 1.044, fg: 1.011, rackDay: 14 },
      },
      {
        plan: hopped(plan('Jetty Pale', 'American pale ale', [1.052, 1.013, 7, 38, 19, 21]), 2),
        brewDay: 14,
        stage: 'fermenting',
        read: { volumeL: 23, og: 1.052 },
      },
      pencilled(hopped(plan('Breakwater', 'Double IPA', [1.076, 1.014, 8, 72, 19, 14]), 8), 35),
      pencilled(plan('Slack Water', 'Ordinary bitter', [1.036, 1.009, 10, 30, 19, 14]), 49),
    ],
  },
  {
    name: 'Lantern lager',
    yeast: 'lantern',
    vessel: 'conical',
    start: { kind: 'pack', price: 1640 },
    batches: [
      {
        plan: plan('First Frost', 'Pale lager', [1.046, 1.011, 3, 22, 11, 28]),
        brewDay: 8,
        stage: 'fermenting',
        read: { volumeL: 23, og: 1.046 },
      },
      pencilled(plan('Icebreaker', 'Baltic porter', [1.088, 1.022, 26, 34, 11, 35]), 36),
    ],
  },
  {
    name: 'Ropewalk stout',
    yeast: 'ropewalk',
    vessel: 'carboy',
    start: { kind: 'outside', generation: 3, price: 550, allergens: ['gluten'], cultures: [] },
    batches: [
      {
        plan: plan('Night Watch', 'Oatmeal stout', [1.054, 1.014, 33, 32, 19, 14]),
        brewDay: 28,
        stage: 'fermenting',
        read: { volumeL: 23, og: 1.054 },
      },
      pencilled(plan('Admiral', 'Imperial stout', [1.095, 1.024, 42, 60, 19, 21]), 42),
    ],
  },
];

export const DEMO_BENCH: readonly DemoBatch[] = [
  pencilled(plan('Spring Tide', 'Kölsch-style ale', [1.047, 1.011, 4, 24, 18, 14]), null),
  pencilled(plan('Chandler', 'Robust porter', [1.06, 1.015, 30, 35, 19, 14]), null),
  pencilled(hopped(plan('Fogbank', 'Hazy IPA', [1.064, 1.016, 5, 40, 20, 14]), 8), null),
  pencilled(plan('Keel', 'Dunkel', [1.052, 1.013, 18, 24, 11, 28]), null),
];
