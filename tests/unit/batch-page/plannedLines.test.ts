import { describe, expect, test } from 'vitest';
import { digestOf } from '#shared/fermentation/digest.ts';
import { DEFAULT_UNITS } from '#shared/units/quantity.ts';
import { plannedLines } from '../../../src/routes/batch/plannedLines.ts';
import { makeBatch } from '../../support/boards.ts';

const READ = { volumeL: 22.4, og: 1.051, fg: 1.011, rackedOn: null };
const planned = { og: 1.052, fg: 1.011, srm: 7, volumeL: 23, stage: 'racked' as const };
const lines = (own: Parameters<typeof makeBatch>[1], units = DEFAULT_UNITS) =>
  Object.fromEntries(
    plannedLines(makeBatch(1, { ...planned, ...own }), units).map(({ label, ...line }) => [
      label,
      line,
    ]),
  );

describe('planned beside read', () => {
  test('gravities in points, attenuation by its definition, volume with its gap', () => {
    const found = lines({ read: READ });
    expect(found['Original gravity']).toMatchObject({ read: '1.051', apart: '−1 point' });
    expect(found['Final gravity']).toMatchObject({ apart: '0', isFar: false });
    // (51 − 11) ÷ 51 and (52 − 11) ÷ 52 points.
    expect(found['Apparent attenuation']).toMatchObject({ planned: '79 %', read: '78 %' });
    expect(found['Volume in the vessel']).toMatchObject({ read: '22.4 L', apart: '−0.6 L' });
  });

  test('what still falls is so far, and not off', () => {
    const at = '2027-03-20T12:00:00.000Z';
    const followed = digestOf([{ kind: 'gravity', at, value: 1.03 }], null);
    const found = lines({ stage: 'fermenting', followed, read: { ...READ, fg: null } });
    expect(found['Final gravity so far']).toMatchObject({ read: '1.030', isFar: false });
  });

  test('in degrees Plato', () => {
    const found = lines({ read: READ }, { ...DEFAULT_UNITS, gravity: 'plato' });
    expect(found['Original gravity']?.apart).toBe('−0.2 °P');
  });

  test('what is not known is said to be so', () =>
    expect(lines({ og: null })['Alcohol']).toMatchObject({ planned: null, apart: '' }));
});
