import { describe, expect, test } from 'vitest';
import { checkPour } from '#shared/pour/check.ts';
import { leaveAt } from '#shared/pour/leave.ts';
import type { PourRun } from '#shared/api/pour.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';
import { DEFAULT_UNITS } from '#shared/units/quantity.ts';
import { createServerClock } from '../../../src/api/serverClock.ts';
import { timeOf } from '../../../src/app/zonedTime.ts';
import { rewrite, written } from '../../../src/components/form/written.ts';
import { ago, inTime } from '../../../src/routes/pour/words.ts';
import { PLOT, plotOf, roundMarks } from '../../../src/routes/pour/wort/plot.ts';
import { readingFault } from '../../../src/routes/pour/wort/readingFault.ts';
import { sayVerdict } from '../../../src/routes/pour/wort/verdictWords.ts';
import { minutes, START } from '../../support/cooling.ts';

describe('what was typed for a temperature', () => {
  const fault = (text: string, units = DEFAULT_UNITS) =>
    readingFault(rewrite(written('temperature', null, units), text, units), units);
  test.each([
    ['21,5', null],
    ['21.5', null],
    ['70 °F', null],
    ['', 'Write the temperature that the thermometer shows'],
    ['warm', 'Write a number, such as 20'],
    ['200', '200 °C would be steam: look at the thermometer again'],
    ['-5', '−5 °C would be ice: look at the thermometer again'],
  ])('%s', (text, expected) => expect(fault(text)).toBe(expected));

  test('in °F', () => {
    const units = { ...DEFAULT_UNITS, temperature: 'f' as const };
    expect(fault('200', units)).toBeNull();
    expect(fault('300', units)).toBe('300 °F would be steam: look at the thermometer again');
    expect(fault('-5', units)).toBe('−5 °F would be ice: look at the thermometer again');
  });
});

describe('the server’s clock', () => {
  test('is measured in the middle of a request, and stays while it can be right', async () => {
    let device = 1_000_000;
    const clock = createServerClock(() => device);
    const ask = (took: number, serverAhead: number) =>
      clock.measured(async () => {
        const now = new Date(device + took / 2 + serverAhead).toISOString();
        device += took;
        return { now };
      });
    await ask(4000, 900);
    expect(clock.offsetMs(), 'a slow answer proves nothing wrong').toBe(0);
    await ask(400, 60_000);
    expect(clock.offsetMs()).toBe(60_000);
    await ask(100, 60_010);
    expect(clock.offsetMs()).toBe(60_000);
    // Somebody set the telephone's clock back an hour.
    await ask(300, 3_660_000);
    expect(clock.offsetMs()).toBe(3_660_000);
    expect(clock.now()).toBe(device + 3_660_000);
  });
});

describe('words', () => {
  test('times in the brewery’s zone, over a change to summer time', () => {
    expect(timeOf('2027-03-28T00:59:00Z', 'Europe/London')).toBe('00:59');
    expect(timeOf('2027-03-28T01:01:00Z', 'Europe/London')).toBe('02:01');
  });
  test.each([
    [-1, 'by now'],
    [1, 'in 1 minute'],
    [12, 'in 12 minutes'],
    [130, 'in 2 h 10 min'],
  ])('%d minutes ahead', (ahead, expected) => {
    expect(inTime(minutes(ahead), START)).toBe(expected);
  });
  test('how long ago', () => {
    expect(ago(minutes(0), minutes(0.5))).toBe('just now');
    expect(ago(minutes(0), minutes(4))).toBe('4 minutes ago');
  });
});

const cooling = [33, 30, 27.5, 25.6, 24.1].map((c, n) => ({ at: minutes(6 * n), c }));
const answer = checkPour({
  yeast: { kind: 'ale', pourMinC: 18, pourMaxC: 22 },
  at: minutes(25),
  readings: cooling,
  rules: DEFAULT_HOUSE_RULES,
});

test('the verdict says the answer first, then when', () => {
  const said = sayVerdict(
    { wort: answer, link: null, linkHolds: [], verdict: 'hold', clear: false, overridable: true },
    minutes(25),
    'UTC',
  );
  expect(said).toMatchObject({ verdict: 'hold', title: 'Hold: 2.1 °C too warm' });
  expect(said.next).toMatch(/^In the window at about 15:\d\d, in \d+ minutes \(15:\d\d to /);
});

test('the plot holds every reading, the window and the forecast inside its frame', () => {
  const plot = plotOf(cooling, answer, minutes(25), roundMarks);
  for (const { at, c } of cooling) {
    expect(plot.x(at)).toBeGreaterThanOrEqual(PLOT.left);
    expect(plot.x(at)).toBeLessThanOrEqual(PLOT.right);
    expect(plot.y(c)).toBeGreaterThanOrEqual(PLOT.top);
    expect(plot.y(c)).toBeLessThanOrEqual(PLOT.floor);
  }
  expect(plot.to).toBeGreaterThan(answer.ready?.latest ?? Number.POSITIVE_INFINITY);
  expect(plot.ahead[0]?.[1]).toBeCloseTo(24.1, 0);
  expect(plot.marks.length).toBeGreaterThan(2);
  expect(plot.marks.length).toBeLessThan(8);
});

describe('leave', () => {
  const who = { personId: '0', name: 'Mo' };
  const reading = (id: string, at: number, withdrawn = false) => ({
    id,
    c: 20,
    typed: {},
    at: new Date(at).toISOString(),
    deviceAt: new Date(at).toISOString(),
    clockOffsetMs: 0,
    arrivedAt: new Date(at).toISOString(),
    by: who,
    withdrawn,
  });
  const leave = {
    id: 'c',
    kind: 'reading' as const,
    readingId: 'a',
    askedBy: who,
    askedAt: new Date(minutes(0)).toISOString(),
    findings: [],
    answer: 'granted' as const,
    answeredBy: null,
    answeredAt: new Date(minutes(0)).toISOString(),
    reason: '',
    expiresAt: new Date(minutes(15)).toISOString(),
  };
  const run = (change: Partial<PourRun>): PourRun => ({
    id: 'r',
    batchId: 'b',
    cakeBatchId: null,
    heldBy: who,
    openedAt: new Date(minutes(0)).toISOString(),
    closedAt: null,
    state: 'open',
    step: 'wort',
    found: {},
    readings: [reading('a', minutes(0))],
    clearances: [leave],
    pour: null,
    ...change,
  });
  test('of the newest reading, for its time', () => {
    expect(leaveAt(run({}), minutes(15), false)?.id).toBe('c');
    expect(leaveAt(run({}), minutes(16), false)).toBeNull();
    const later = run({ readings: [reading('a', minutes(0)), reading('b', minutes(5))] });
    expect(leaveAt(later, minutes(6), false)).toBeNull();
    expect(leaveAt(later, minutes(4), false)?.id).toBe('c');
    expect(
      leaveAt(run({ readings: [reading('a', minutes(0), true)] }), minutes(1), false),
    ).toBeNull();
  });
  test('a reading’s ends with what ends every leave', () => {
    expect(leaveAt(run({}), minutes(3), true)).toBeNull();
  });
  test('a head brewer’s ends where the wort kills', () => {
    const override = { ...leave, kind: 'override' as const };
    expect(leaveAt(run({ clearances: [override] }), minutes(3), false)?.id).toBe('c');
    expect(leaveAt(run({ clearances: [override] }), minutes(3), true)).toBeNull();
    expect(
      leaveAt(run({ clearances: [{ ...override, answer: null }] }), minutes(3), false),
    ).toBeNull();
  });
});
