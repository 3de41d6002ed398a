import { forecast } from '#shared/pour/forecast.ts';
import { chance, read } from '../support/cooling.ts';
import type { Part } from './row.ts';

const FITS = 1000;
const MOST_MS = 1000;

/** The pour check's forecast: 1,000 coolings with seven readings each, the interval included. */
export const cooling: Part = {
  name: 'cooling',
  run: async () => {
    const all = Array.from({ length: FITS }, (_, n) => {
      const next = chance(n + 1);
      return read({ from: 40, towards: 10 + 6 * next(), tau: 40 + 30 * next() }, next, 5, 7);
    });
    const start = performance.now();
    let told = 0;
    for (const readings of all)
      if (forecast({ readings, window: { minC: 18, maxC: 22 }, coolantC: 10 }).ready) told += 1;
    const took = performance.now() - start;
    return [
      {
        what: `${FITS} cooling fits of seven readings, ${told} of them with a forecast`,
        reach: `≤ ${MOST_MS} ms`,
        measured: `${took.toFixed(0)} ms`,
        holds: took <= MOST_MS && told > FITS / 2,
      },
    ];
  },
};
