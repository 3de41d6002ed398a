import { expect, test } from 'vitest';
import { blonde, check, paleAle, standing } from '../../support/links.ts';

test.each([
  [undefined, 'nowhere'],
  [1, 'passed'],
  [2, 'passed'],
  [3, 'mind'],
  [9, 'mind'],
])('beer %s since the vessel was cleaned: %s', (beersSinceCleaning, expected) => {
  const pour = beersSinceCleaning === undefined ? {} : { beersSinceCleaning };
  expect(standing(check({ a: blonde(), b: paleAle(), pour }), 'unwashed-vessel')).toBe(expected);
});
