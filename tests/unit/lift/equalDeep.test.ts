import { describe, expect, it } from 'vitest';
import { equalDeep } from '../../../src/api/equalDeep.ts';

const link = () => ({
  to: 'a',
  findings: [{ rule: 'allergen', measures: [{ value: 1.5 }] }],
  kept: null,
});

describe('what says the same', () => {
  it('is equal, however deep, and whatever the order of its fields', () => {
    expect(equalDeep(link(), link())).toBe(true);
    expect(equalDeep({ a: 1, b: [] }, { b: [], a: 1 })).toBe(true);
    expect(equalDeep(Number.NaN, Number.NaN)).toBe(true);
  });

  it.each([
    [
      'a figure deep inside',
      { ...link(), findings: [{ rule: 'allergen', measures: [{ value: 2 }] }] },
    ],
    ['one finding fewer', { ...link(), findings: [] }],
    ['a field more', { ...link(), more: undefined }],
    ['another name of a field', { to: 'a', findings: link().findings, held: null }],
    ['a list for a row', { ...link(), kept: [] }],
    ['nothing', null],
  ])('is not: %s', (_, other) => {
    expect(equalDeep(link(), other)).toBe(false);
    expect(equalDeep(other, link())).toBe(false);
  });
});
