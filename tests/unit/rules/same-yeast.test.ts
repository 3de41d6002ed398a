import { describe, expect, test } from 'vitest';
import { blonde, check, CLEAN_ALE, paleAle, standing } from '../../support/links.ts';

const at = (otherYeast: { kind: 'ale' | 'lager'; character?: boolean } | undefined, own = false) =>
  standing(
    check({
      a: blonde(),
      b: paleAle(),
      pour: otherYeast === undefined ? {} : { otherYeast },
      yeast: { ...CLEAN_ALE, character: own },
    }),
    'same-yeast',
  );

describe('same-yeast', () => {
  test('the chain’s own yeast passes', () => expect(at(undefined)).toBe('passed'));
  test('another plain yeast of the kind is a mind', () =>
    expect(at({ kind: 'ale', character: false })).toBe('mind'));
  test('another kind is a hold', () =>
    expect(at({ kind: 'lager', character: false })).toBe('hold'));
  test.each([
    ['the wanted one', true, false],
    ['the chain’s', false, true],
  ])('a marked character of %s is a hold', (_name, character, own) =>
    expect(at({ kind: 'ale', character }, own)).toBe('hold'),
  );
  test('an unknown character still is a mind at least', () =>
    expect(at({ kind: 'ale' })).toBe('mind'));
});
