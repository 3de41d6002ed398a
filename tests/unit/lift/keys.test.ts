import { describe, expect, it } from 'vitest';
import { intentOf, isLiftKey, undoKeyOf } from '../../../src/routes/board/lift/keys.ts';

const press = (
  key: string,
  held: Partial<Record<'ctrlKey' | 'metaKey' | 'altKey' | 'shiftKey', true>> = {},
) => ({
  key,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  shiftKey: false,
  ...held,
});

describe('keys of a lifted batch', () => {
  it.each([
    ['ArrowRight', 'next'],
    ['ArrowLeft', 'previous'],
    ['ArrowDown', 'worse'],
    ['ArrowUp', 'better'],
    ['Home', 'best'],
    ['Enter', 'put-down'],
    [' ', 'put-down'],
    ['Escape', 'put-back'],
    ['Tab', null],
    ['a', null],
  ] as const)('%s means %s', (key, intent) => {
    expect(intentOf(press(key))).toBe(intent);
  });

  it('leaves keys with Ctrl, Cmd or Alt to the browser', () => {
    expect(intentOf(press('ArrowLeft', { altKey: true }))).toBeNull();
    expect(isLiftKey(press('Enter', { ctrlKey: true }))).toBe(false);
  });

  it('lifts with Enter and Space alone', () => {
    expect(['Enter', ' ', 'x'].map((key) => isLiftKey(press(key)))).toEqual([true, true, false]);
  });
});

describe('undo keys', () => {
  it.each([
    [press('z', { ctrlKey: true }), 'undo'],
    [press('Z', { metaKey: true }), 'undo'],
    [press('Z', { ctrlKey: true, shiftKey: true }), 'redo'],
    [press('z', { metaKey: true, shiftKey: true }), 'redo'],
    [press('y', { ctrlKey: true }), 'redo'],
    [press('y', { metaKey: true }), null],
    [press('z'), null],
    [press('z', { ctrlKey: true, altKey: true }), null],
  ] as const)('%o', (pressed, which) => {
    expect(undoKeyOf(pressed)).toBe(which);
  });
});
