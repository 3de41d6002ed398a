import { describe, expect, it } from 'vitest';
import { pathOf } from '../../../src/components/form/serverErrors.ts';
import { changesFrom, conflictsOf, mergeTyped } from '../../../src/components/form/rowEdit.ts';

const base = { name: 'Keel', og: 1.052, dryHops: [] as string[], notes: '' };

describe('an edit of a row that somebody else may have changed', () => {
  it('sends only what differs from the row as it was opened', () => {
    expect(changesFrom(base, { ...base, og: 1.054, dryHops: ['a'] })).toEqual({
      og: 1.054,
      dryHops: ['a'],
    });
  });

  it('sees no conflict where each touched another field', () => {
    expect(conflictsOf(base, { og: 1.054 }, { ...base, notes: 'theirs' })).toEqual([]);
  });

  it('sees no conflict where both wrote the same', () => {
    expect(conflictsOf(base, { og: 1.054 }, { ...base, og: 1.054 })).toEqual([]);
  });

  it('names the fields that both changed differently', () => {
    const theirs = { ...base, og: 1.05, notes: 'theirs' };
    expect(conflictsOf(base, { og: 1.054, name: 'Mine' }, theirs)).toEqual(['og']);
  });

  it('joins typed texts by whose field it is', () => {
    const text = (value: string) => ({ text: value, unit: 'SG' });
    expect(
      mergeTyped(
        { og: text('1.050'), fg: text('1.010'), 'dryHops.0.gramsPerLitre': text('1') },
        { og: text('1,054'), fg: text('1,012') },
        ['og', 'dryHops'],
      ),
    ).toEqual({ og: text('1,054'), fg: text('1.010') });
  });
});

describe('a JSON pointer of a problem', () => {
  it.each([
    ['/og', 'og'],
    ['/dryHops/0/gramsPerLitre', 'dryHops.0.gramsPerLitre'],
    ['#/start/price', 'start.price'],
    ['/a~1b/c~0d', 'a/b.c~d'],
  ])('%s is the field %s', (pointer, path) => {
    expect(pathOf(pointer)).toBe(path);
  });
});
