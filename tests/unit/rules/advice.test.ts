import { describe, expect, it } from 'vitest';
import type { PourFacts } from '#shared/rules/facts.ts';
import { blonde, check, paleAle } from '../../support/links.ts';

const jarring = (pour: PourFacts): string | undefined =>
  check({ a: blonde(), b: paleAle(), pour }).advice.find(({ id }) => id === 'jar-the-rest')?.text;

/** Litres in a text such as `735 mL` or `1.2 L`. */
const litres = (text: string | undefined): number => {
  const [, figure = '', unit] = /([\d.]+) (mL|L)/.exec(text ?? '') ?? [];
  return Number(figure) / (unit === 'mL' ? 1000 : 1);
};

describe('the advice to jar what is not needed', () => {
  it('says which litres are left where a part is kept', () => {
    const { keep, cake } = check({ a: blonde(), b: paleAle(), pour: { keepL: 0.5 } });
    expect(keep.keptL).toBe(0.5);
    const said = jarring({ keepL: 0.5 });
    expect(said).toMatch(/^The other [\d.]+ m?L of cake could be jarred, lid loose\. /);
    expect(litres(said) + 0.5).toBeCloseTo(cake.volumeL ?? 0, 1);
  });

  it('says it of the recommended part too', () => {
    const { keep, cake } = check({ a: blonde(), b: paleAle(), pour: { keepL: 'recommended' } });
    const left = (cake.volumeL ?? 0) - (keep.recommendedL ?? 0);
    expect(litres(jarring({ keepL: 'recommended' }))).toBeCloseTo(left, 1);
  });

  it('says nothing where the whole cake is kept, or other worts take the rest', () => {
    expect(jarring({})).toBeUndefined();
    const { cake } = check({ a: blonde(), b: paleAle() });
    const rest = (cake.volumeL ?? 0) - 0.5;
    const shared = [{ name: 'Slack Water', litres: rest }];
    expect(jarring({ keepL: 0.5, sharedWith: shared })).toBeUndefined();
  });

  it('leaves the verdict as it is', () => {
    const { verdict, findings } = check({ a: blonde(), b: paleAle(), pour: { keepL: 0.5 } });
    expect({ verdict, findings }).toEqual({ verdict: 'pour', findings: [] });
  });
});
