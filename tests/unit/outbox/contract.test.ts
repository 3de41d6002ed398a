import { describe, expect, it } from 'vitest';
import { CONTRACT, CONTRACTS, isContractTaken } from '#shared/api/contract.ts';

const THREE = [
  { number: 1, replacedOn: '2026-09-01' },
  { number: 2, replacedOn: '2026-11-20' },
  { number: 3, replacedOn: null },
];
const at = (text: string) => new Date(text);

describe('a contract', () => {
  it('is taken while it is in force, and for 90 days after it was replaced', () => {
    const taken = (number: number, now: string) => isContractTaken(number, at(now), THREE);
    expect(taken(3, '2036-01-01T00:00:00Z')).toBe(true);
    // 1 September and 90 days are 30 November: that whole day still counts.
    expect(taken(1, '2026-11-30T23:59:59Z')).toBe(true);
    expect(taken(1, '2026-12-01T00:00:00Z')).toBe(false);
    expect(taken(2, '2026-12-01T00:00:00Z')).toBe(true);
  });

  it('of a newer release is taken; what is no number is none', () => {
    const now = at('2026-12-01T00:00:00Z');
    expect(isContractTaken(4, now, THREE)).toBe(true);
    for (const none of [0, -1, 1.5, Number.NaN])
      expect(isContractTaken(none, now, THREE)).toBe(false);
  });

  it('numbers go up by one, and only the last is in force', () => {
    expect(CONTRACTS.map(({ number }) => number)).toEqual(CONTRACTS.map((_, at) => at + 1));
    expect(CONTRACTS.filter(({ replacedOn }) => replacedOn === null)).toEqual([CONTRACTS.at(-1)]);
    expect(isContractTaken(CONTRACT, new Date())).toBe(true);
  });
});
