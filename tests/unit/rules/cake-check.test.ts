import { describe, expect, test } from 'vitest';
import type { BoardContext } from '#shared/rules/facts.ts';
import { blonde, check, paleAle, standing } from '../../support/links.ts';

const at = (board: BoardContext | undefined) =>
  standing(check({ a: blonde(), b: paleAle(), rest: { board } }), 'cake-check');
const judged = (check: Omit<NonNullable<BoardContext['cakeCheck']>, 'dueWithinADay'>) =>
  at({ cakeCheck: { dueWithinADay: true, ...check } });

describe('cake-check', () => {
  test('stands nowhere off the board', () => {
    expect(at(undefined)).toBe('nowhere');
    expect(at({})).toBe('nowhere');
  });

  test('nobody has judged it: a mind once the pour is due', () => {
    expect(at({ cakeCheck: { dueWithinADay: false } })).toBe('passed');
    expect(at({ cakeCheck: { dueWithinADay: true } })).toBe('mind');
  });

  test.each([
    ['fit', 'passed'],
    ['with-care', 'mind'],
    ['unfit', 'hold'],
  ] as const)('judged %s: %s', (word, expected) => expect(judged({ judged: word })).toBe(expected));

  test.each([
    [0.1, 'passed'],
    [0.101, 'mind'],
    [0.25, 'mind'],
    [0.251, 'hold'],
  ])('%d dead: %s', (dead, expected) => expect(judged({ judged: 'fit', dead })).toBe(expected));

  test('an off taste or a stuck fermentation is a hold', () => {
    expect(judged({ judged: 'fit', tastedOff: true })).toBe('hold');
    expect(judged({ judged: 'fit', fermentationStuck: true })).toBe('hold');
  });

  test('what the readings warn of is a mind, until somebody judged the cake in spite of it', () => {
    const noticed = ['It was last read at 26 °C.'];
    expect(at({ cakeCheck: { dueWithinADay: false, noticed: [] } })).toBe('passed');
    expect(at({ cakeCheck: { dueWithinADay: false, noticed } })).toBe('mind');
    expect(judged({ judged: 'fit', noticed })).toBe('passed');
    expect(judged({ judged: 'with-care', noticed })).toBe('mind');
  });
});
