import { describe, expect, it } from 'vitest';
import type { PourFacts } from '#shared/rules/facts.ts';
import { blonde, check, paleAle } from '../../support/links.ts';

const jarring = (pour: PourFacts): string | undefined =>
  check({ a: blonde(), b: paleAle(), pour }).advice.find(({ id }) => id === 'jar-the-rest')?.text;

describe('the advice to jar what is not kept', () => {
  it('tells of the rest where a part is kept', () => {
    expect(jarring({ keepL: 'recommended' })).toMatch(/^The other [\d.]+ m?L of cake could be/);
  });

  it('says nothing where the whole cake is kept: the link has its own line for what is enough', () => {
    expect(jarring({})).toBeUndefined();
  });

  it('leaves the verdict as it is', () => {
    const { verdict, findings } = check({ a: blonde(), b: paleAle() });
    expect({ verdict, findings }).toEqual({ verdict: 'pour', findings: [] });
  });
});
