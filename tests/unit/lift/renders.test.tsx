// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import { memo, Profiler } from 'react';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { Board } from '#shared/api/board.ts';
import { Vessel } from '../../../src/components/drawn/Vessel.tsx';
import { boardQuery, useBoard } from '../../../src/api/board.ts';
import { sessionQuery } from '../../../src/api/session.ts';
import { GapSlot } from '../../../src/routes/board/lift/GapSlot.tsx';
import { LiftHandle } from '../../../src/routes/board/lift/LiftHandle.tsx';
import { LiftProvider } from '../../../src/routes/board/lift/LiftProvider.tsx';
import { PlacesPanel } from '../../../src/routes/board/lift/PlacesPanel.tsx';
import { BoardViewProvider } from '../../../src/routes/board/view/BoardView.tsx';
import { ALE, beer, twoShelves } from './board.ts';

let vessels = 0;
let slots = 0;

const Place = memo(function Place({ number }: { number: number }) {
  return (
    <li data-batch={beer(number)}>
      <Profiler id="vessel" onRender={() => (vessels += 1)}>
        <Vessel shape="bucket" srm={6} fill={0.7} cake={0.1} stage="pencilled" />
      </Profiler>
      <LiftHandle batchId={beer(number)} />
      <Profiler id="slot" onRender={() => (slots += 1)}>
        <GapSlot gapKey={`${ALE}:${beer(number)}`} vesselShape="bucket" />
      </Profiler>
    </li>
  );
});

function Shelf() {
  const { batches } = useBoard();
  return (
    <ol data-chain={ALE}>
      {batches.map((_, at) => (
        <Place key={at} number={at + 1} />
      ))}
    </ol>
  );
}

function open(board: Board) {
  const client = new QueryClient();
  client.setQueryData(boardQuery('saltmarsh').queryKey, board);
  client.setQueryData(sessionQuery.queryKey, null);
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={['/b/saltmarsh']}>
        <Routes>
          <Route
            path="/b/:brewery"
            element={
              <BoardViewProvider>
                <LiftProvider>
                  <Shelf />
                  <PlacesPanel />
                </LiftProvider>
              </BoardViewProvider>
            }
          />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
}

const frames = (count: number) =>
  act(() => {
    for (let frame = 0; frame < count; frame += 1) vi.advanceTimersToNextFrame();
  });

beforeEach(() => {
  vi.useFakeTimers();
  vi.stubGlobal('CSS', { escape: (text: string) => text });
  Element.prototype.scrollIntoView = () => undefined;
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

// Finding buttons by name takes its time on a busy machine.
it(
  'draws no vessel anew while a batch is lifted, walked about and put back',
  { timeout: 30_000 },
  () => {
    open(twoShelves());
    expect(vessels).toBe(7);
    const handle = screen.getByRole('button', { name: 'Lift Beer 6' });
    handle.focus();
    fireEvent.keyDown(handle, { key: 'Enter' });
    frames(12);
    expect(screen.getByRole('status').textContent).toMatch(/^Lifted Beer 6/);
    expect(document.querySelectorAll('[data-gap-open]').length).toBeGreaterThan(1);

    slots = 0;
    fireEvent.keyDown(handle, { key: 'ArrowRight' });
    frames(2);
    expect(screen.getByRole('status').textContent).toContain('Harbour ale, place 2 of 4');
    expect(slots).toBe(1);
    fireEvent.keyDown(handle, { key: 'ArrowRight' });
    frames(2);
    // The place that is left, and the one that is reached.
    expect(slots).toBe(3);

    fireEvent.keyDown(handle, { key: 'Escape' });
    frames(8);
    expect(screen.getByRole('status').textContent).toBe('Beer 6 put back on the bench.');
    expect(document.querySelectorAll('[data-gap-open]')).toHaveLength(0);
    expect(document.activeElement).toBe(handle);
    expect(vessels).toBe(7);
  },
);
