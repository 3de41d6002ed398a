import { describe, expect, test } from 'vitest';
import { lagAtLeast, lagAtMost } from '#shared/fermentation/lag.ts';
import { noticesOf } from '#shared/fermentation/notices.ts';
import { isStuck } from '#shared/fermentation/stuck.ts';
import { lowestOfYeast } from '#shared/fermentation/tooLow.ts';
import { gravity, hour, warmth, watched } from './watched.ts';

const found = (...args: Parameters<typeof watched>) =>
  noticesOf(watched(...args)).map(({ id }) => id);

describe('lag over 24 hours', () => {
  test.each([
    [23, []],
    [24, []],
    [24.1, ['lag']],
  ])('no fall seen at %d h', (hours, expected) =>
    expect(found([gravity(0, 1.05), gravity(hours, 1.05)])).toEqual(expected),
  );
  test('is counted from the pour, not from the first reading', () =>
    expect(found([gravity(30, 1.05)])).toEqual(['lag']));
  test('stays said after it has begun', () =>
    expect(found([gravity(0, 1.05), gravity(30, 1.05), gravity(48, 1.04)])).toEqual(['lag']));
  test('a first reading that stands below the original gravity has begun', () => {
    const late = watched([gravity(40, 1.04), gravity(41, 1.04)]);
    expect(noticesOf(late)).toEqual([]);
    expect([lagAtLeast(late), lagAtMost(late)]).toEqual([null, 40]);
  });
  test('lies between the last still and the first fallen reading', () => {
    const seen = watched([gravity(0, 1.05), gravity(10, 1.05), gravity(16, 1.047)]);
    expect([lagAtLeast(seen), lagAtMost(seen)]).toEqual([10, 16]);
  });
});

describe('stuck: unchanged over three days, more than 0.005 above the expected end', () => {
  const at = (hours: number, sg: number) =>
    isStuck(watched([gravity(0, 1.05), gravity(48, sg), gravity(48 + hours, sg)]));
  test.each([
    [71, 1.02, false],
    [72, 1.02, true],
    [73, 1.02, true],
    [96, 1.0165, false],
    [96, 1.017, false],
    [96, 1.0171, true],
  ])('%d hours at %d: %s', (hours, sg, expected) => expect(at(hours, sg)).toBe(expected));
  test('a beer that never started is said once', () =>
    expect(found([gravity(0, 1.05), gravity(80, 1.05)])).toEqual(['stuck']));
  test('nothing is said where the end is not known', () =>
    expect(
      found([gravity(0, 1.02), gravity(96, 1.02)], { expectedFg: null, plannedFg: null, og: 1.05 }),
    ).toEqual([]));
});

describe('lower than the yeast goes', () => {
  // 75 % of 50 points leave 12.5; 8 % more leave 8.5.
  test.each([
    [1.0086, []],
    [1.0085, []],
    [1.0084, ['too-low']],
  ])('%d: %j', (sg, expected) =>
    expect(found([gravity(0, 1.05), gravity(10, 1.03), gravity(90, sg)])).toEqual(expected),
  );
  test('a yeast of unknown attenuation is suspect beyond 90 % (Meier-Dörnberg et al. 2017)', () => {
    expect(lowestOfYeast({ og: 1.05, plannedFg: null, attenuation: null })).toBeCloseTo(1.005, 9);
  });
  test('a plan that goes lower is believed, and a declared wild culture may', () => {
    const readings = [gravity(0, 1.05), gravity(10, 1.03), gravity(90, 1.002)];
    expect(found(readings, { plannedFg: 1.003, expectedFg: 1.003 })).toEqual([]);
    expect(found(readings, { cultures: ['diastatic'] })).toEqual([]);
  });
});

describe('temperature', () => {
  const during = (c: number) => found([gravity(0, 1.05), gravity(12, 1.04), warmth(13, c)]);
  test.each([
    [17.9, ['temperature']],
    [18, []],
    [22, []],
    [22.1, ['temperature']],
  ])('%d °C in 18–22: %j', (c, expected) => expect(during(c)).toEqual(expected));
  test('a beer that is done may be cold, not hot', () => {
    const done = (c: number) => found([gravity(0, 1.05), gravity(240, 1.014), warmth(241, c)]);
    expect(done(2)).toEqual([]);
    expect(done(23)).toEqual(['temperature']);
  });
  test('a yeast without a range of its own has the usual one, 15–26 °C', () => {
    const own = { fermentMinC: null, fermentMaxC: null };
    const readings = (c: number) => [gravity(0, 1.05), gravity(12, 1.04), warmth(13, c)];
    expect(found(readings(26), own)).toEqual([]);
    expect(found(readings(26.1), own)).toEqual(['temperature']);
  });
});

test('what is said names the figures and their basis', () => {
  const [notice] = noticesOf(watched([gravity(0, 1.05), gravity(48, 1.02), gravity(144, 1.02)]));
  expect(notice?.because).toContain('1.020');
  expect(notice?.basis).toContain('common practice');
  expect(hour(0)).toBe('2027-03-20T10:00:00.000Z');
});
