import { expect, it } from 'vitest';
import { runsOf } from '../../../src/routes/board/lift/runs.ts';

const rows = (...shelves: (string | null)[]) => shelves.map((shelf, rank) => ({ shelf, rank }));
const told = (...shelves: (string | null)[]) =>
  runsOf(rows(...shelves)).map((run) => [run.shelf, ...run.rows.map(({ rank }) => rank)]);

it('gathers neighbours of one shelf and leaves the ranking as it is', () => {
  expect(told('Ale', 'Ale', 'Lager', 'Ale', null, 'Lager', 'Lager')).toEqual([
    ['Ale', 0, 1],
    ['Lager', 2],
    ['Ale', 3],
    [null, 4],
    ['Lager', 5, 6],
  ]);
});

it('gathers nothing that is on no shelf', () => {
  expect(told(null, null)).toEqual([
    [null, 0],
    [null, 1],
  ]);
});
