import { describe, expect, it } from 'vitest';
import type { StageRequest } from '#shared/api/batch.ts';
import { factSentence, fromTo } from '#shared/record/facts.ts';
import { tellHouseRules } from '#shared/record/houseRules.ts';
import { tellBatch, tellLink, tellSeason } from '#shared/record/sentences.ts';
import { tellStage } from '#shared/record/stages.ts';
import type { Sayer } from '#shared/record/words.ts';
import { UNSETTLED_LINK } from '#shared/chain/board.ts';
import { DEFAULT_UNITS } from '#shared/units/quantity.ts';
import { boardOf, makeBatch } from '../../support/boards.ts';

const metric: Sayer = {
  units: DEFAULT_UNITS,
  currency: 'EUR',
  nameOf: (id) => (id === 'v' ? 'Bucket' : null),
};
const american: Sayer = {
  ...metric,
  units: { system: 'us', gravity: 'plato', colour: 'ebc', temperature: 'f' },
};
const keel = makeBatch(1, {
  name: 'Keel',
  ibu: 24,
  og: 1.044,
  fermentC: 20,
  srm: 4,
  dryHops: [],
  brewOn: null,
  vesselId: null,
  trub: 'some',
});

describe('fromTo', () => {
  it.each([
    ['24 IBU', '28 IBU', 'from 24 to 28 IBU'],
    ['400 mL', '1.25 L', 'from 400 mL to 1.25 L'],
    ['1.044', '1.048', 'from 1.044 to 1.048'],
    ['−2 °C', '4 °C', 'from −2 to 4 °C'],
    [null, '28 IBU', 'to 28 IBU'],
    ['28 IBU', null, 'from 28 IBU to not known'],
    ['gluten', 'gluten and milk', 'from gluten to gluten and milk'],
  ])('%s, %s', (from, to, words) => {
    expect(fromTo(from, to)).toBe(words);
  });
});

describe('a batch', () => {
  it.each<[Sayer, object, string]>([
    [metric, { ibu: 28 }, 'Set the bitterness of Keel from 24 to 28 IBU'],
    [metric, { ibu: null }, 'Took out the bitterness of Keel, which was 24 IBU'],
    [metric, { brewOn: '2027-04-03' }, 'Set the brew day of Keel to Sat 3 April'],
    [metric, { vesselId: 'v' }, 'Set the vessel of Keel to Bucket'],
    [metric, { vesselId: 'x' }, 'Set the vessel of Keel to one that is gone'],
    [metric, { name: 'Ebb' }, 'Renamed Keel to Ebb'],
    [metric, {}, 'Changed Keel'],
    [
      metric,
      { dryHops: [{ gramsPerLitre: 3, contained: 'loose', timing: 'on-cake' }] },
      'Set the dry hops of Keel from none to 3 g/L loose on the cake',
    ],
    // 68 °F is 20 °C and 70 °F is 21.1 °C, by definition of the scale.
    [
      american,
      { fermentC: 70 / 1.8 - 32 / 1.8 },
      'Set the fermentation temperature of Keel from 68 to 70 °F',
    ],
    [
      metric,
      { ibu: 28, srm: 6 },
      'Changed Keel: colour from 4 to 6 SRM, bitterness from 24 to 28 IBU',
    ],
    [
      metric,
      { name: 'Ebb', ibu: 28, srm: 6 },
      'Changed Keel: name from Keel to Ebb, colour from 4 to 6 SRM and 1 more',
    ],
  ])('%#: says what changed', (sayer, change, what) => {
    expect(tellBatch(sayer, keel, { ...keel, ...change }).what).toBe(what);
  });

  it('keeps each fact, however many stand in the sentence', () => {
    const change = { ibu: 28, srm: 6, og: 1.05, trub: 'much' as const };
    expect(tellBatch(metric, keel, { ...keel, ...change }).facts).toHaveLength(4);
  });
});

it.each([
  [{ keepL: 0.4 }, 'Set the kept part of the cake under Keel from the recommended part to 400 mL'],
  [
    { keepWhole: true },
    'Set the kept part of the cake under Keel from the recommended part to all of it',
  ],
  [{ starter: true }, 'Set the starter of the cake under Keel from no to yes'],
])('a link: %o', (change, what) => {
  const after = { ...UNSETTLED_LINK, ...change };
  expect(tellLink(metric, 'Keel', UNSETTLED_LINK, after).what).toBe(what);
});

it.each<[StageRequest, string]>([
  [
    { stage: 'fermenting', brewedOn: '2027-04-03', volumeL: 23, og: 1.052 },
    'Brewed Keel on Sat 3 April, 23 L at 1.052',
  ],
  [
    { stage: 'fermenting', brewedOn: '2027-04-03', volumeL: null, og: null },
    'Brewed Keel on Sat 3 April',
  ],
  [
    { stage: 'racked', rackedOn: '2027-04-17', volumeL: null, fg: 1.012 },
    'Racked Keel on Sat 17 April, 1.012',
  ],
  [{ stage: 'scrapped', reason: 'no malt' }, 'Scrapped Keel: no malt'],
  [{ stage: 'pencilled' }, 'Put Keel back to pencilled'],
])('a stage: %o', (wish, what) => {
  expect(tellStage(metric, 'Keel', wish)).toBe(what);
});

it.each([
  [{ blockedDays: ['2027-04-03', '2027-04-10'] }, 'Blocked Sat 3 April for brewing'],
  [
    { blockedDays: [], brewsPerDay: 2 },
    'Set the brews a day of the season Spring from 1 to 2; freed Sat 10 April',
  ],
  [{ brewWeekdays: [6] }, 'Set the brew days of the season Spring from Sat and Sun to Sat'],
  [{ name: 'Summer' }, 'Renamed the season Spring to Summer'],
])('a season: %o', (change, what) => {
  const before = {
    ...boardOf({}).season,
    name: 'Spring',
    brewWeekdays: [6, 7],
    brewsPerDay: 1,
    blockedDays: ['2027-04-10'],
  };
  expect(tellSeason(before, { ...before, ...change }).what).toBe(what);
});

describe('house rules', () => {
  it.each([
    [
      {},
      { colourShiftHold: 4 },
      'Set the colour shift for a Hold of the house rules from ΔE 3 to ΔE 4',
    ],
    [
      {},
      { jumpHold: 80 },
      'Set the step up in gravity for a Hold of the house rules from never to 80 points',
    ],
    [
      { jumpHold: 80 },
      {},
      'Set the step up in gravity for a Hold of the house rules from 80 points to never',
    ],
    [{ darkSrm: 5, freeHold: 0.1 }, {}, 'Put the house rules back to the defaults'],
    [{}, { freeHold: 0.1 }, 'Set the headspace for a Hold of the house rules from 5 to 10 %'],
  ])('%o to %o', (before, after, what) => {
    expect(tellHouseRules(before, after, DEFAULT_UNITS).what).toBe(what);
  });

  it('reads in the units of the brewery', () => {
    const { facts } = tellHouseRules({}, { tiredOgMind: 1.07, outOfRangeHold: 5 }, american.units);
    // 5 °C of difference are 9 °F; 1.070 is 17.1 °P and 1.065 15.9 °P in tables of extract.
    expect(facts.map(({ from, to }) => fromTo(from, to))).toEqual([
      'from 15.9 to 17.1 °P',
      'from 3.6 to 9 °F',
    ]);
  });
});

it('counts what is too much for a button', () => {
  const facts = ['a', 'b', 'c', 'd'].map((label) => ({ label, from: null, to: '1' }));
  expect(factSentence('of Keel', 'Changed Keel', facts)).toBe(
    'Changed Keel: a to 1, b to 1 and 2 more',
  );
});
