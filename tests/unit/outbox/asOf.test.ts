import { expect, test } from 'vitest';
import { asOf } from '../../../src/kept/asOf.ts';

const at = (text: string) => new Date(text).getTime();

test('what was read today has its time, what was read before also its day', () => {
  const read = at('2027-03-20T14:05:30');
  expect(asOf(read, at('2027-03-20T23:59:00'))).toBe('at 14:05');
  expect(asOf(read, at('2027-03-21T00:00:00'))).toBe('on Sat 20 March at 14:05');
});
