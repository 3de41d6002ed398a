// @vitest-environment jsdom
import { fireEvent } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { followPress } from '../../../src/routes/board/lift/followPress.ts';

const at = (type: string, x: number, y: number, pointerId = 1) => {
  // jsdom draws no pointer events of its own.
  const event = new MouseEvent(type, { clientX: x, clientY: y, bubbles: true, cancelable: true });
  return Object.assign(event, { pointerId, pointerType: 'mouse' }) as MouseEvent as PointerEvent;
};

function press() {
  const told: string[] = [];
  followPress(at('pointerdown', 100, 100), {
    lift: ({ x, y }) => told.push(`lift ${x} ${y}`),
    moved: () => told.push('moved'),
    drop: ({ x, y }) => told.push(`drop ${x} ${y}`),
    cancel: () => told.push('cancel'),
  });
  return told;
}
const send = (...events: Event[]) => events.forEach((event) => document.body.dispatchEvent(event));

beforeEach(() => void vi.useFakeTimers());
// Whatever a test left: a press that is followed, a click that is to be swallowed.
afterEach(() => {
  send(at('pointerup', 0, 0));
  fireEvent.click(document.body);
  vi.runAllTimers();
  vi.useRealTimers();
});

describe('a press', () => {
  it('becomes a lift after six pixels, and a drop where it ends', () => {
    const told = press();
    send(at('pointermove', 103, 104));
    expect(told).toEqual([]);
    send(at('pointermove', 104, 105), at('pointermove', 110, 100), at('pointerup', 120, 90));
    expect(told).toEqual(['lift 104 105', 'moved', 'moved', 'drop 120 90']);
    send(at('pointermove', 200, 200), at('pointerup', 200, 200));
    expect(told).toHaveLength(4);
  });

  it('that never moves is nothing, and its click goes through', () => {
    const told = press();
    let clicks = 0;
    const count = () => (clicks += 1);
    document.body.addEventListener('click', count);
    send(at('pointerup', 100, 100));
    fireEvent.click(document.body);
    document.body.removeEventListener('click', count);
    expect([told, clicks]).toEqual([[], 1]);
  });

  it('swallows the click that a browser makes of the drop', () => {
    press();
    let clicks = 0;
    const count = () => (clicks += 1);
    document.body.addEventListener('click', count);
    send(at('pointermove', 120, 100), at('pointerup', 120, 100));
    fireEvent.click(document.body);
    fireEvent.click(document.body);
    document.body.removeEventListener('click', count);
    expect(clicks).toBe(1);
  });

  it('is put back by Escape, a lost pointer or a page that is left', () => {
    for (const end of [
      new KeyboardEvent('keydown', { key: 'Escape', bubbles: true, cancelable: true }),
      at('pointercancel', 0, 0),
    ]) {
      const told = press();
      send(at('pointermove', 120, 100), end, at('pointerup', 120, 100));
      expect(told).toEqual(['lift 120 100', 'moved', 'cancel']);
    }
    const told = press();
    send(at('pointermove', 120, 100));
    document.dispatchEvent(new Event('visibilitychange'));
    expect(told.at(-1)).toBe('cancel');
  });

  it('that Escape ended presses nothing when the button is let go', () => {
    press();
    let clicks = 0;
    const count = () => (clicks += 1);
    document.body.addEventListener('click', count);
    const escape = new KeyboardEvent('keydown', { key: 'Escape', bubbles: true, cancelable: true });
    send(at('pointermove', 120, 100), escape, at('pointerup', 120, 100));
    fireEvent.click(document.body);
    fireEvent.click(document.body);
    document.body.removeEventListener('click', count);
    expect(clicks).toBe(1);
  });

  it('is none of another finger’s business', () => {
    const told = press();
    send(at('pointermove', 150, 100, 2), at('pointerup', 150, 100, 2));
    expect(told).toEqual([]);
    send(at('pointermove', 120, 100));
    expect(told).toEqual(['lift 120 100', 'moved']);
  });
});
