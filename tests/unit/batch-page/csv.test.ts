import { expect, test } from 'vitest';
import type { Reading } from '#shared/api/reading.ts';
import { readingsCsv } from '../../../src/routes/batch/readings/csv.ts';

const id = (n: number) => `00000000-0000-4000-8000-00000000000${n}`;
const reading = (change: Partial<Reading>): Reading => ({
  id: id(1),
  version: 1,
  kind: 'gravity',
  takenAt: '2027-03-20T11:05:00.000Z',
  shown: 1.018,
  value: 1.0205,
  method: 'hydrometer',
  sampleC: 30,
  instrumentId: null,
  notes: '',
  typed: {},
  by: { personId: id(2), name: 'Mo' },
  ...change,
});

test('one line a reading, in stored units, with the brewery’s clock and UTC', async () => {
  const text = await readingsCsv([reading({})], [], 'Europe/London');
  expect(text.split('\r\n')).toEqual([
    'when,when (UTC),what,value,unit,as shown,read by,sample °C,instrument,note,by',
    '2027-03-20 11:05,2027-03-20T11:05:00.000Z,gravity,1.0205,SG,1.018,hydrometer,30,,,Mo',
  ]);
});

test.each(['=HYPERLINK("x")', '+1', '-1', '@sum', '\t=1'])(
  'a note or a name that a table program would run is made harmless: %j',
  async (notes) => {
    const text = await readingsCsv(
      [reading({ notes, by: { personId: id(2), name: notes } })],
      [],
      'Europe/London',
    );
    const cells = text.split('\r\n')[1]?.split(',') ?? [];
    expect(cells.slice(-2).every((cell) => /^"?'/.test(cell))).toBe(true);
  },
);

test('a temperature below zero stays a number', async () => {
  const cold = reading({ kind: 'temperature', method: null, sampleC: null, shown: -1, value: -1 });
  expect(await readingsCsv([cold], [], 'UTC')).toContain(',temperature,-1,°C,-1,');
});
