import { expect, test } from 'vitest';
import { digestOf } from '#shared/fermentation/digest.ts';
import { gravity, hour, warmth } from './watched.ts';

test('no reading comes to nothing', () => expect(digestOf([], null)).toBeNull());

test('a course of readings: first, newest, begun, still, steady', () => {
  const readings = [
    gravity(0, 1.05),
    gravity(12, 1.049),
    warmth(20, 19.4),
    gravity(24, 1.044),
    gravity(96, 1.013),
    gravity(120, 1.012),
    gravity(144, 1.012),
    warmth(150, 18.8),
  ];
  expect(digestOf(readings, hour(-1))).toEqual({
    count: 8,
    lastAt: hour(150),
    pouredAt: hour(-1),
    firstGravity: 1.05,
    firstGravityAt: hour(0),
    gravity: 1.012,
    gravityAt: hour(144),
    steadyFrom: hour(96),
    lowest: 1.012,
    begunAt: hour(24),
    stillAt: hour(12),
    temperatureC: 18.8,
    temperatureAt: hour(150),
  });
});

test('0.001 apart is the same gravity, 0.0011 is not', () => {
  expect(digestOf([gravity(0, 1.013), gravity(48, 1.012)], null)?.steadyFrom).toBe(hour(0));
  expect(digestOf([gravity(0, 1.0131), gravity(48, 1.012)], null)?.steadyFrom).toBe(hour(48));
});

test('a gravity that went away and came back is steady only since', () => {
  const readings = [gravity(0, 1.012), gravity(24, 1.016), gravity(48, 1.012)];
  expect(digestOf(readings, null)?.steadyFrom).toBe(hour(48));
});

test('a fall of 0.002 has begun, of 0.0019 not', () => {
  expect(digestOf([gravity(0, 1.05), gravity(8, 1.048)], null)?.begunAt).toBe(hour(8));
  expect(digestOf([gravity(0, 1.05), gravity(8, 1.0481)], null)?.begunAt).toBeNull();
});

test('temperatures alone know no gravity', () =>
  expect(digestOf([warmth(0, 19)], null)).toMatchObject({
    gravity: null,
    steadyFrom: null,
    begunAt: null,
    stillAt: null,
    lowest: null,
  }));
