import { expect, test } from 'vitest';
import { formatMoney } from '#shared/units/money.ts';

test.each([
  [1250, 'EUR', '€12.50'],
  [99, 'GBP', '£0.99'],
  [1250, 'JPY', '¥1,250'],
  [1250, 'KWD', 'KWD\u00a01.250'],
  [333.4, 'USD', '$3.33'],
])('%d of %s', (minor, currency, text) => expect(formatMoney(minor, currency)).toBe(text));

test('what is no currency is refused', () => {
  expect(() => formatMoney(1, 'euro')).toThrow(RangeError);
});
