import { describe, expect, it } from 'vitest';
import { BEER_IN_CAKE } from '#shared/cake/blend.ts';
import { CELLS_PER_ML_CAKE, SETTLED, VIABILITY } from '#shared/cake/estimate.ts';
import { checkLink } from '#shared/chain/checkLink.ts';
import { workingsOf } from '#shared/science/workings.ts';
import { RULE_IDS } from '#shared/rules/vocabulary.ts';
import { ETHANOL_DENSITY } from '#shared/units/alcohol.ts';
import { EXTRACT_FIT } from '#shared/units/gravity.ts';
import { scienceSectionOf } from '../../../src/app/scienceSections.ts';
import { RULES_EXPLAINED } from '../../../src/routes/checks/rulesExplained.ts';
import { DEFAULT_UNITS } from '#shared/units/quantity.ts';
import { SECTIONS } from '../../../src/routes/science/sections/all.ts';
import { ale, linkOf } from './link.ts';

const strongAfterPale = linkOf(
  ale({ id: 'a', og: 1.076, fg: 1.014, srm: 8, ibu: 72, brewOn: '2027-03-06' }),
  ale({ id: 'b', og: 1.044, fg: 1.01, srm: 4, ibu: 20, brewOn: '2027-03-22' }),
);

/** The page sets the formulas out; here they are worked by hand with the figures that it shows. */
describe('what the science page explains is what was judged', () => {
  const { link, growth, alcohol, wait, need } = workingsOf(strongAfterPale);
  const answer = checkLink(strongAfterPale);

  it('gravity: the cubic as it is written', () => {
    const [c0, c1, c2, c3] = EXTRACT_FIT;
    const sg = 1.076;
    expect(growth?.plato).toBeCloseTo(c0 + c1 * sg + c2 * sg ** 2 + c3 * sg ** 3, 9);
  });

  it('alcohol: by weight, then by volume', () => {
    if (!alcohol) throw new Error('The alcohol is known');
    expect(alcohol.re).toBeCloseTo(0.1808 * alcohol.oe + 0.8192 * alcohol.ae, 9);
    expect(alcohol.byWeight).toBeCloseTo(
      (alcohol.oe - alcohol.re) / (2.0665 - 0.010665 * alcohol.oe),
      9,
    );
    expect(link.abvA).toBeCloseTo((alcohol.byWeight * 1.014) / ETHANOL_DENSITY, 6);
  });

  it('cells: pitched and grown, settled, alive after the wait, and the litres they fill', () => {
    if (!growth || !wait) throw new Error('The cake and its wait are known');
    const settled = SETTLED * (growth.pitched + 7e6 * growth.share * growth.drop * 23_000);
    const survives = Math.exp(-wait.rate * 2);
    expect(answer.waitDays).toBe(2);
    expect(answer.cake.viableCells?.likely).toBeCloseTo(settled * VIABILITY * survives, -5);
    const litres = settled / (CELLS_PER_ML_CAKE * (1 - growth.trub)) / 1000;
    expect(answer.cake.volumeL).toBeCloseTo(litres, 9);
    expect(wait.rate).toBeCloseTo(Math.exp(-4.319 + 0.107 * 20), 9);
  });

  it('need, part to keep and ratio', () => {
    if (!need || !answer.cake.viableCells) throw new Error('Need and cake are known');
    const wanted = need.perMlPlato * need.plato * 23_000;
    expect(answer.need.viableCells).toBeCloseTo(wanted, 0);
    expect(need.perMlPlato).toBeCloseTo(0.75e6, 3);
    const part = ((answer.cake.volumeL ?? 0) * wanted) / answer.cake.viableCells.low;
    expect(answer.keep.recommendedL).toBeCloseTo(part, 9);
  });

  it('what is carried over', () => {
    const kept = answer.keep.keptL ?? 0;
    const share = kept / (answer.cake.volumeL ?? 1);
    const stays = BEER_IN_CAKE * kept + 0.02 * 23 * share;
    const mixed = (a: number, b: number) => (23 * b + stays * a) / (23 + stays);
    expect(answer.blend.srm).toBeCloseTo(mixed(8, 4), 9);
    expect(answer.blend.ibu).toBeCloseTo(mixed(72, 20), 9);
    expect(answer.blend.og).toBeCloseTo(mixed(1.014, 1.044), 9);
    expect(link.kept.freeShare).toBeCloseTo((32 - 23 - kept - 0.46 * share) / 23, 6);
  });

  it('shows the verdict’s own figures', () => {
    const work = { ...workingsOf(strongAfterPale), earlier: 'A', later: 'B', units: DEFAULT_UNITS };
    const shown = (section: string, id: string) =>
      SECTIONS.find((one) => one.id === section)
        ?.figures(work)
        .find((figure) => figure.id === id)?.value;
    const figure = (text: string | null | undefined) => Number.parseFloat(text ?? '');
    expect(figure(shown('colour-difference', 'delta-e'))).toBeCloseTo(
      answer.blend.deltaE00 ?? 0,
      1,
    );
    expect(figure(shown('need', 'need'))).toBeCloseTo((answer.need.viableCells ?? 0) / 1e9, 0);
    expect(figure(shown('keep', 'ratio'))).toBeCloseTo(answer.keep.ratio ?? 0, 0);
    expect(figure(shown('blending', 'bitterness-poured'))).toBeCloseTo(answer.blend.ibu ?? 0, 0);
  });
});

describe('sections', () => {
  it('have one place for every rule', () => {
    const places = new Set<string>(SECTIONS.map(({ id }) => id));
    for (const { id } of RULES_EXPLAINED)
      if (scienceSectionOf(id) === `rule-${id}`) places.add(`rule-${id}`);
    for (const rule of RULE_IDS) expect(places).toContain(scienceSectionOf(rule));
  });

  it('say that a figure is not known where facts are missing', () => {
    const bare = linkOf({ id: 'a' }, { id: 'b' });
    const work = { ...workingsOf(bare), earlier: 'A', later: 'B', units: DEFAULT_UNITS };
    for (const working of ['alcohol', 'need', 'mixing'] as const)
      expect(work[working], working).toBeUndefined();
    for (const { id, figures } of SECTIONS)
      for (const figure of figures(work))
        expect(figure.value ?? '', id).not.toMatch(/NaN|undefined/);
  });
});
