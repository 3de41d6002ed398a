import type { DemoChain } from './batches.ts';
import type { DemoBatch } from './demoBatch.ts';
import { plan } from './plan.ts';

/** The season before, brewed to its end and archived. Days count from its first brew day. */
export const PAST_SEASON = {
  name: 'Winter season',
  /** So many days before this season's first brew day. */
  before: 140,
  lasts: 105,
} as const;

const racked = (
  of: DemoBatch['plan'],
  brewDay: number,
  days: number,
  read: { volumeL: number; og: number; fg: number },
): DemoBatch => ({
  plan: of,
  brewDay,
  stage: 'racked',
  read: { ...read, rackDay: brewDay + days },
});

const last = (batch: DemoBatch): DemoBatch => ({ ...batch, dumped: true });

export const PAST_CHAINS: readonly DemoChain[] = [
  {
    name: 'Winter ales',
    yeast: 'harbour',
    vessel: 'bucket',
    start: { kind: 'pack', price: 1350 },
    batches: [
      racked(plan('Mudlark', 'Best bitter', [1.042, 1.01, 9, 32, 19, 14]), 0, 14, {
        volumeL: 22.5,
        og: 1.042,
        fg: 1.011,
      }),
      racked(plan('Curlew Brown', 'Brown ale', [1.048, 1.012, 18, 26, 19, 14]), 14, 14, {
        volumeL: 23,
        og: 1.047,
        fg: 1.012,
      }),
      last(
        racked(plan('Long Dark', 'Porter', [1.056, 1.014, 28, 34, 19, 21]), 28, 21, {
          volumeL: 22,
          og: 1.057,
          fg: 1.014,
        }),
      ),
    ],
  },
  {
    name: 'Ice house lager',
    yeast: 'lantern',
    vessel: 'conical',
    start: { kind: 'pack', price: 1600 },
    batches: [
      racked(plan('Hoarfrost', 'Pale lager', [1.046, 1.011, 3, 22, 11, 28]), 7, 28, {
        volumeL: 23,
        og: 1.046,
        fg: 1.01,
      }),
      last(
        racked(plan('Night Ice', 'Dark lager', [1.05, 1.013, 19, 24, 11, 28]), 35, 28, {
          volumeL: 23,
          og: 1.051,
          fg: 1.013,
        }),
      ),
    ],
  },
];
