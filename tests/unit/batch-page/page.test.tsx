// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, within } from '@testing-library/react';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { Batch } from '#shared/api/batch.ts';
import type { BatchRecord, Reading } from '#shared/api/reading.ts';
import { digestOf } from '#shared/fermentation/digest.ts';
import { batchRecordQuery } from '../../../src/api/batchRecord.ts';
import { boardQuery } from '../../../src/api/board.ts';
import { sessionQuery } from '../../../src/api/session.ts';
import { BatchPage } from '../../../src/routes/batch/BatchPage.tsx';
import { beer, twoShelves } from '../lift/board.ts';

const START = Date.parse('2027-03-06T12:00:00Z');
const id = (n: number) => `00000000-0000-4000-9000-${String(n).padStart(12, '0')}`;

/** A gravity and a temperature in turn, five minutes apart. */
const readings = (count: number): Reading[] =>
  Array.from({ length: count }, (_, nth) => {
    const isGravity = nth % 2 === 0;
    const value = isGravity ? 1.05 - (0.04 * nth) / count : 19 + Math.sin(nth / 30);
    return {
      id: id(nth),
      version: 1,
      kind: isGravity ? 'gravity' : 'temperature',
      takenAt: new Date(START + nth * 300_000).toISOString(),
      shown: value,
      value,
      method: isGravity ? 'hydrometer' : null,
      sampleC: null,
      instrumentId: null,
      notes: '',
      typed: {},
      by: { personId: id(1), name: 'Mo' },
    };
  });

const record = (own: Partial<BatchRecord>): BatchRecord => ({
  batchId: beer(1),
  readings: [],
  notes: [],
  events: [],
  instruments: [],
  check: null,
  pouredAt: null,
  ...own,
});

function open(own: Partial<Batch>, written: BatchRecord | null) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  const board = twoShelves();
  const batches = board.batches.map((batch) =>
    batch.id === beer(1) ? { ...batch, ...own } : batch,
  );
  client.setQueryData(boardQuery('saltmarsh').queryKey, { ...board, batches });
  client.setQueryData(sessionQuery.queryKey, null);
  if (written) client.setQueryData(batchRecordQuery('saltmarsh', beer(1)).queryKey, written);
  return render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={[`/b/saltmarsh/batches/${beer(1)}`]}>
        <Routes>
          <Route path="/b/:brewery/batches/:id" element={<BatchPage />} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
}

beforeEach(() => {
  vi.stubGlobal('matchMedia', (query: string) => ({
    matches: false,
    media: query,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('no network in this test')));
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

test('a batch without a reading says what to do', () => {
  open({ stage: 'fermenting', brewOn: '2027-03-06' }, record({}));
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Beer 1');
  expect(screen.getByText(/Nothing is read yet/)).toBeTruthy();
});

test('thousands of readings are drawn by few rows and few points', () => {
  const many = readings(5000);
  const followed = digestOf(
    many.map(({ kind, takenAt, value }) => ({ kind, at: takenAt, value })),
    null,
  );
  const { container } = open(
    { stage: 'fermenting', brewOn: '2027-03-06', followed },
    record({ readings: many }),
  );
  const table = within(screen.getByRole('region', { name: 'Readings' })).getByRole('table');
  expect(within(table).getAllByRole('row')).toHaveLength(13);
  expect(screen.getByRole('button', { name: 'Show 200 older of 4988' })).toBeTruthy();
  const points = [...container.querySelectorAll('figure polyline')].map(
    (line) => line.getAttribute('points')?.split(' ').length ?? 0,
  );
  expect(points.length).toBeGreaterThanOrEqual(2);
  expect(Math.max(...points)).toBeLessThanOrEqual(400);
  expect(container.querySelectorAll('figure circle')).toHaveLength(0);
});

test('a record that does not come says so, and may be asked for again', async () => {
  open({ stage: 'fermenting', brewOn: '2027-03-06' }, null);
  expect(await screen.findByRole('alert')).toBeTruthy();
  expect(screen.getByRole('button', { name: 'Try again' })).toBeTruthy();
});
