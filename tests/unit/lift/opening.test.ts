import { describe, expect, it } from 'vitest';
import { judgedPlaces } from '../../../src/routes/board/lift/judging.ts';
import type { Lifted } from '../../../src/routes/board/lift/liftState.ts';
import { createLiftStore } from '../../../src/routes/board/lift/liftStore.ts';
import { openOutward } from '../../../src/routes/board/lift/openOutward.ts';
import { ALE, beer, LAGER, twoShelves } from './board.ts';

/** Frames that pass when they are told to, so many milliseconds after each other. */
function clock(frameMs = 16) {
  let waiting: ((at: number) => void)[] = [];
  let at = 0;
  return {
    nextFrame: (run: (at: number) => void) => void waiting.push(run),
    pass() {
      const now = waiting;
      waiting = [];
      at += frameMs;
      for (const run of now) run(at);
    },
  };
}

const KEYS = [
  `${ALE}:${beer(1)}`,
  `${ALE}:${beer(2)}`,
  `${ALE}:${beer(3)}`,
  `${LAGER}:first`,
  `${LAGER}:${beer(4)}`,
  `${LAGER}:${beer(5)}`,
  'new',
];

function scene(frameMs?: number) {
  const board = twoShelves();
  const store = createLiftStore();
  const frames = clock(frameMs);
  let scroll = (_at: number) => {};
  let inSight = KEYS;
  const ports = {
    nextFrame: frames.nextFrame,
    gapsInSight: () => [...inSight],
    onScroll: (run: (at: number) => void) => {
      scroll = run;
      return () => undefined;
    },
  };
  const places = judgedPlaces(board, beer(6));
  const lifted: Lifted = {
    batchId: beer(6),
    name: 'Beer 6',
    by: 'pointer',
    chainId: null,
    shape: null,
    ...places,
  };
  store.set({ lifted });
  return {
    store,
    frames,
    ports,
    places,
    scroll: () => scroll(0),
    see: (keys: string[]) => (inSight = keys),
  };
}

type Scene = ReturnType<typeof scene>;
const openUp = ({ store, ports }: Scene) => openOutward(store, ports, beer(6));

/** How many gaps stand open after each of some frames. */
const course = ({ store, frames }: Scene, count: number) =>
  Array.from({ length: count }, () => {
    frames.pass();
    return store.get().opened.size;
  });

describe('a lift', () => {
  it('opens a few gaps in a frame until all in sight are open', () => {
    const one = scene();
    openUp(one);
    const sizes = course(one, 12);
    const steps = sizes.map((size, at) => size - (sizes[at - 1] ?? 0));
    expect(Math.max(...steps)).toBeLessThanOrEqual(2);
    expect([...one.store.get().opened.keys()].toSorted()).toEqual(KEYS.toSorted());
  });

  it('opens one by one where frames are slow', () => {
    const one = scene(40);
    openUp(one);
    const sizes = course(one, 16);
    const steps = sizes.map((size, at) => size - (sizes[at - 1] ?? 0));
    expect(Math.max(...steps.slice(steps.findIndex((step) => step > 0) + 1))).toBe(1);
    expect([...one.store.get().opened.keys()].toSorted()).toEqual(KEYS.toSorted());
  });

  it('opens the best gap first', () => {
    const one = scene();
    const best = one.places.ranked.find((gap) => gap.best)?.key ?? expect.unreachable('no best');
    one.see([...KEYS.filter((key) => key !== best), best]);
    openUp(one);
    course(one, 12);
    expect([...one.store.get().opened.keys()][0]).toBe(best);
  });

  it('opens what scrolls into sight, and measures nothing meanwhile', () => {
    const one = scene();
    one.see(KEYS.slice(0, 2));
    openUp(one);
    expect(course(one, 8).at(-1)).toBe(2);
    one.see(KEYS.slice(2, 4));
    one.scroll();
    course(one, 4);
    expect([...one.store.get().opened.keys()].toSorted()).toEqual(KEYS.slice(0, 4).toSorted());
  });

  it('closes as slowly once it is over, and not while another is under way', () => {
    const one = scene();
    const { store, frames } = one;
    const end = openUp(one);
    course(one, 12);
    store.set({ lifted: null });
    end();
    const sizes = course(one, 2);
    expect(sizes[0]).toBeGreaterThan(0);
    expect(course(one, 4).at(-1)).toBe(0);
    frames.pass();
    expect(store.get().opened.size).toBe(0);
  });
});

describe('the store', () => {
  it('tells a gap and a batch only of what is theirs', () => {
    const { store } = scene();
    const told: string[] = [];
    const listen = (key: string) => store.subscribeTo(key, () => told.push(key));
    const stop = listen('new');
    [...KEYS.slice(0, 2), beer(6), beer(7)].forEach(listen);
    store.set({ over: 'new' });
    store.set({ over: KEYS[0] ?? null });
    store.set({ placesFor: beer(7) });
    store.set({ lifted: null });
    expect(told).toEqual(['new', 'new', KEYS[0], beer(6)]);
    stop();
    store.set({ over: 'new' });
    expect(told.slice(4)).toEqual([KEYS[0]]);
  });
});
