import { describe, expect, it } from 'vitest';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import { HOUSE_RULE_WORDS, houseRuleValue } from '#shared/rules/houseRuleWords.ts';
import { NEVER_SOFTENED } from '#shared/rules/resolve.ts';
import { DEFAULT_UNITS } from '#shared/units/quantity.ts';
import { linkChanges } from '#shared/chain/linkChanges.ts';
import { rewrite } from '../../../src/components/form/written.ts';
import {
  backToDefault,
  changesOf,
  draftOf,
  faultsOf,
  isDefault,
  limitsOf,
  type Draft,
} from '../../../src/routes/rules/draft.ts';
import { RULE_SENTENCES } from '../../../src/routes/rules/ruleSentences.ts';
import { ALL_EXPLAINED } from '../../../src/routes/checks/rulesExplained.ts';
import { boardOf, makeBatch, makeChain, makeYeast } from '../../support/boards.ts';

const US = { system: 'us', gravity: 'plato', colour: 'ebc', temperature: 'f' } as const;

function typed(draft: Draft, texts: Partial<Record<HouseRuleKey, string>>, units = DEFAULT_UNITS) {
  const limits = { ...draft.limits };
  for (const [key, text] of Object.entries(texts) as [HouseRuleKey, string][])
    limits[key] = rewrite(limits[key], text, units);
  return { ...draft, limits };
}
const start = draftOf({}, DEFAULT_UNITS);

describe('a draft of the house rules', () => {
  it('that nobody touched saves nothing, in whatever units it is shown', () => {
    for (const units of [DEFAULT_UNITS, US]) {
      expect(changesOf(draftOf({}, units))).toEqual({});
      expect(faultsOf(draftOf({}, units), units)).toEqual({});
      const own = { darkSrm: 5, jumpHold: 80, softened: ['tired-cake' as const] };
      expect(changesOf(draftOf(own, units))).toEqual(own);
    }
  });

  it('reads what is typed in the units of the reader', () => {
    expect(changesOf(typed(start, { darkSrm: '4,5', freeHold: '10' }))).toEqual({
      darkSrm: 4.5,
      freeHold: 0.1,
    });
    // A step of 9 °F is one of 5 °C; EBC is 1.97 times SRM.
    const american = typed(draftOf({}, US), { outOfRangeHold: '9', darkSrm: '9.85' }, US);
    const changes = changesOf(american);
    expect(changes.outOfRangeHold).toBeCloseTo(5, 9);
    expect(changes.darkSrm).toBeCloseTo(5, 1);
  });

  it('takes an empty hold of the step in gravity for never, and no other emptiness', () => {
    expect(changesOf(typed(draftOf({ jumpHold: 80 }, DEFAULT_UNITS), { jumpHold: '' }))).toEqual(
      {},
    );
    expect(faultsOf(typed(start, { jumpHold: '' }), DEFAULT_UNITS)).toEqual({});
    expect(faultsOf(typed(start, { darkSrm: '' }), DEFAULT_UNITS)).toEqual({
      darkSrm: 'Write a number',
    });
  });

  it.each<[Partial<Record<HouseRuleKey, string>>, object]>([
    [{ darkSrm: 'dark' }, { darkSrm: 'Write a number, such as 7' }],
    [{ darkSrm: '21' }, { darkSrm: 'Between 0 SRM and 20 SRM' }],
    [{ freeHold: '70' }, { freeHold: 'Between 0 % and 60 %' }],
    [{ colourShiftMind: '4' }, { colourShiftMind: 'At most ΔE 3, where the Hold begins' }],
    [{ colourShiftHold: '0.5' }, { colourShiftHold: 'At least ΔE 1, where the Mind begins' }],
    [{ survivalMind: '60' }, { survivalMind: 'At least 70 %, where the Hold begins' }],
    [{ survivalHold: '90' }, { survivalHold: 'At most 88 %, where the Mind begins' }],
    [{ holdAfter: '2.5' }, { holdAfter: 'Write a whole number, such as 5' }],
  ])('%o: says what is wrong at the field', (texts, faults) => {
    expect(faultsOf(typed(start, texts), DEFAULT_UNITS)).toEqual(faults);
  });

  it('puts one rule back and leaves the others', () => {
    const draft = {
      ...typed(start, { darkSrm: '5', hopsMind: '0.8' }),
      softened: ['light-to-dark' as const, 'tired-cake' as const],
    };
    expect(isDefault(draft, 'light-to-dark')).toBe(false);
    const back = backToDefault(draft, 'light-to-dark', DEFAULT_UNITS);
    expect(isDefault(back, 'light-to-dark')).toBe(true);
    expect(changesOf(back)).toEqual({ hopsMind: 0.8, softened: ['tired-cake'] });
  });
});

describe('the sentences', () => {
  it('hold every limit once', () => {
    const all = ALL_EXPLAINED.flatMap(({ id }) => limitsOf(id));
    expect(all.toSorted()).toEqual(Object.keys(HOUSE_RULES).toSorted());
  });

  it('belong to rules that are shown', () => {
    const shown = new Set<string>(ALL_EXPLAINED.map(({ id }) => id));
    for (const rule of [...Object.keys(RULE_SENTENCES), ...NEVER_SOFTENED])
      expect(shown.has(rule)).toBe(true);
  });

  it('name each limit apart from the others, with a unit', () => {
    expect(new Set(Object.values(HOUSE_RULE_WORDS)).size).toBe(Object.keys(HOUSE_RULES).length);
    expect(houseRuleValue('holdAfter', 1, DEFAULT_UNITS)).toBe('1 generation');
    expect(houseRuleValue('jumpHold', null, DEFAULT_UNITS)).toBe('never');
    expect(houseRuleValue('baggedShare', 0.125, DEFAULT_UNITS)).toBe('12.5 %');
  });
});

describe('what the board would say', () => {
  const yeast = makeYeast(1, 'ale');
  const chain = makeChain(1, { yeastId: yeast.id, vesselId: null });
  const on = { chainId: chain.id, daysUnderBeer: 14, vesselId: null, yeastId: null };
  const board = boardOf({
    yeasts: [yeast],
    chains: [chain],
    batches: [
      makeBatch(1, { ...on, place: 0, name: 'Strong', og: 1.095, fg: 1.02, brewOn: '2027-03-06' }),
      makeBatch(2, { ...on, place: 1, name: 'Next', og: 1.095, fg: 1.02, brewOn: '2027-03-20' }),
    ],
  });

  it('is nothing new under the same rules', () => {
    expect(linkChanges(board, { ...board, houseRules: { darkSrm: 3 } })).toEqual([]);
  });

  it('is told link by link, from and to', () => {
    const houseRules = { softened: ['tired-cake' as const] };
    const [change, ...others] = linkChanges(board, { ...board, houseRules });
    expect(others).toEqual([]);
    expect(change).toMatchObject({
      name: 'Next',
      from: { verdict: 'hold', reason: 'Tired cake' },
      to: { verdict: 'mind' },
    });
  });
});
