import { expect, test } from 'vitest';
import { indexBoard } from '#shared/chain/board.ts';
import { driftOf, hasDrift } from '#shared/chain/drift.ts';
import { digestOf } from '#shared/fermentation/digest.ts';
import { boardOf, idOf, makeBatch, makeChain, makeYeast } from '../../support/boards.ts';

const chainId = idOf('chain', 1);
const at = (hours: number) => new Date(Date.parse('2027-03-06T12:00:00Z') + hours * 3_600_000);
const gravity = (hours: number, value: number) => ({
  kind: 'gravity' as const,
  at: at(hours).toISOString(),
  value,
});
const first = makeBatch(1, {
  chainId,
  place: 0,
  stage: 'racked',
  brewOn: '2027-03-06',
  fg: 1.02,
  read: { volumeL: 23, og: 1.05, fg: 1.01, rackedOn: '2027-03-20' },
  followed: digestOf(
    [gravity(0, 1.05), gravity(10, 1.05), gravity(18, 1.046)],
    at(0).toISOString(),
  ),
  cake: {
    state: 'poured',
    check: null,
    measured: { volumeL: null, massKg: null, viability: 0.93, cellsPerMl: null },
  },
});
const second = makeBatch(2, { chainId, place: 1, stage: 'fermenting', og: 1.06, fg: 1.012 });
const third = makeBatch(3, { chainId, place: 2 });
const board = boardOf({
  yeasts: [makeYeast(1, 'ale')],
  chains: [makeChain(1)],
  batches: [first, second, third],
});

test('only what was read, of brewed batches, against the generation', () => {
  const generation = new Map([
    [first.id, 1],
    [second.id, 2],
  ]);
  const points = driftOf(indexBoard(board), { generation }, chainId);
  expect(points.map(({ name, ...rest }) => rest)).toEqual([
    {
      batchId: first.id,
      generation: 1,
      attenuation: expect.closeTo(0.8, 9),
      lagHours: { least: 10, most: 18 },
      viability: 0.93,
      days: 14,
    },
    {
      batchId: second.id,
      generation: 2,
      attenuation: null,
      lagHours: { least: null, most: null },
      viability: null,
      days: null,
    },
  ]);
  expect([hasDrift(points), hasDrift(points.slice(1))]).toEqual([true, false]);
});
