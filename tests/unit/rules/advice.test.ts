import { describe, expect, it } from 'vitest';
import type { PourFacts } from '#shared/rules/facts.ts';
import { blonde, check, paleAle } from '../../support/links.ts';

const jarring = (pour: PourFacts, b = paleAle()): string | undefined =>
  check({ a: blonde(), b, pour }).advice.find(({ id }) => id === 'jar-the-rest')?.text;

/** Litres in a text such as `735 mL` or `1.2 L`. */
const litres = (text: string | undefined): number => {
  const [, figure = '', unit] = /([\d.]+) (mL|L)/.exec(text ?? '') ?? [];
  return Number(figure) / (unit === 'mL' ? 1000 : 1);
};

describe('the advice to jar what is not needed', () => {
  it('says of a whole cake which part is enough and what is left', () => {
    const { keep, cake } = check({ a: blonde(), b: paleAle() });
    const said = jarring({});
    expect(said).toMatch(
      /^[\d.]+ m?L is enough; the other [\d.]+ m?L could be jarred, lid loose\. /,
    );
    const [enough, other] = said?.split(';') ?? [];
    expect(litres(enough)).toBeCloseTo(keep.recommendedL ?? 0, 2);
    expect(litres(enough) + litres(other)).toBeCloseTo(cake.volumeL ?? 0, 1);
  });

  it('says nothing where the whole cake, or nearly all of it, is needed', () => {
    const large = { ...paleAle(), volumeL: 40, og: 1.09 };
    const { keep, cake } = check({ a: blonde(), b: large });
    expect(keep.recommendedL).toBeGreaterThan(0.8 * (cake.volumeL ?? Infinity));
    expect(jarring({}, large)).toBeUndefined();
  });

  it('tells of the rest only where a part is kept', () => {
    expect(jarring({ keepL: 'recommended' })).toMatch(/^The other [\d.]+ m?L of cake could be/);
  });

  it('leaves the verdict as it is', () => {
    const { verdict, findings } = check({ a: blonde(), b: paleAle() });
    expect({ verdict, findings }).toEqual({ verdict: 'pour', findings: [] });
  });
});
