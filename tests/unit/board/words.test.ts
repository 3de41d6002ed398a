import { describe, expect, it } from 'vitest';
import type { Finding } from '#shared/rules/answer.ts';
import { makeBatch, makeYeast } from '../../support/boards.ts';
import * as words from '../../../src/routes/board/view/words.ts';
import { measureText } from '../../../src/routes/board/panel/measureWords.ts';
import { pourLine } from '../../../src/routes/board/panel/LinkTitle.tsx';

const METRIC = { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' } as const;
const PLATO = { ...METRIC, gravity: 'plato' } as const;

describe('the season in one line', () => {
  const line = (onShelves: number, chains: number, packs: number, hold: number) =>
    words.seasonLine({ onShelves, chains, packs, hold });
  it.each([
    [line(8, 3, 3, 1), '8 batches on 3 cakes · 3 packs to buy · one link on hold'],
    [line(1, 1, 1, 0), '1 batch on 1 cake · 1 pack to buy · no link on hold'],
    [line(0, 0, 0, 2), '0 batches on 0 cakes · 0 packs to buy · 2 links on hold'],
  ])('%s', (said, expected) => expect(said).toBe(expected));
});

describe('the stage of a batch', () => {
  const today = '2027-03-29';
  it('counts the days since the brew day', () => {
    const batch = makeBatch(1, { stage: 'fermenting', brewOn: '2027-03-20' });
    expect(words.stageLine(batch, today)).toBe('Fermenting, day 9');
    expect(words.isFoaming(batch, today)).toBe(false);
    expect(words.isFoaming(batch, '2027-03-23')).toBe(true);
  });
  it('leaves out what is not known', () => {
    expect(words.stageLine(makeBatch(1, { stage: 'fermenting', brewOn: null }), today)).toBe(
      'Fermenting',
    );
    expect(words.stageLine(makeBatch(1, { stage: 'racked' }), today)).toBe('Racked');
  });
});

describe('the step from beer to beer', () => {
  const beer = (n: number, og: number | null) => makeBatch(n, { og });
  it.each([
    [1.044, 1.052, '+8 points'],
    [1.052, 1.051, '−1 point'],
    [1.05, 1.05, '+0 points'],
  ])('%d to %d is %s', (from, to, said) => {
    expect(words.gravityStep(beer(1, from), beer(2, to), METRIC)).toBe(said);
  });
  it('is told in °P to whom prefers it, and not at all where it is unknown', () => {
    // 1.040 is 9.99 °P and 1.048 is 11.91 °P by the ASBC polynomial.
    expect(words.gravityStep(beer(1, 1.04), beer(2, 1.048), PLATO)).toBe('+1.9 °P');
    expect(words.gravityStep(beer(1, null), beer(2, 1.048), METRIC)).toBe('');
  });
});

describe('the short reason', () => {
  const finding = (verdict: 'mind' | 'hold', title: string) =>
    ({
      rule: 'tired-cake',
      verdict,
      title,
      because: '',
      do: '',
      measures: [],
      basis: '',
    }) satisfies Finding;
  const link = (findings: Finding[]) => ({ findings }) as Parameters<typeof words.shortReason>[0];
  it('is the worst finding, else the step', () => {
    const both = link([finding('mind', 'Hops in the cake'), finding('hold', 'Tired cake')]);
    expect(words.shortReason(both, '+8 points')).toBe('tired cake');
    expect(words.shortReason(link([]), '+8 points')).toBe('+8 points');
  });
  it('counts the findings of its verdict alone', () => {
    const findings = [finding('mind', 'a'), finding('hold', 'b'), finding('hold', 'c')];
    expect(words.countedFindings({ verdict: 'hold', findings })).toBe(2);
  });
});

describe('the yeast and its generations', () => {
  it('says kind and range', () => {
    const own = { character: false, fermentMinC: 18, fermentMaxC: 22 };
    const yeast = { ...makeYeast(1, 'ale'), ...own };
    expect(words.yeastLine(yeast, METRIC)).toBe('clean ale · 18–22 °C');
    expect(words.yeastLine({ ...yeast, fermentMinC: null, fermentMaxC: null }, METRIC)).toBe(
      'clean ale',
    );
  });
  it.each([
    [[1, 4], 'generation 1–4 of 7'],
    [[3, 3], 'generation 3 of 7'],
  ] as const)('%j is %s', (generations, said) => {
    expect(words.generationLine(generations, 7)).toBe(said);
  });
});

describe('a measure', () => {
  it.each([
    [1.076, 'SG', '1.076'],
    [2, 'g/L', '2 g/L'],
    [1.4321, 'ΔE00', 'ΔE00 1.43'],
    [3.512, '× need', '3.51 × need'],
    [-2, 'days', '−2 days'],
  ])('%d %s reads %s', (value, unit, said) => {
    expect(measureText(value, unit, METRIC)).toBe(said);
  });
});

describe('the day of a pour', () => {
  const earlier = makeBatch(1, { name: 'Jetty Pale', brewOn: '2026-03-20' });
  it('counts from the brew day of the beer before', () => {
    expect(pourLine(earlier, makeBatch(2, { brewOn: '2026-04-03' }))).toBe(
      'Pour on Fri 3 April, day 14 of Jetty Pale',
    );
  });
  it('says where there is none', () => {
    expect(pourLine(earlier, makeBatch(2, { brewOn: null }))).toBe('No pouring day yet');
  });
});
