import type { Judge } from './outcome.ts';
import type { HouseRules } from './resolve.ts';
import type { Verdict } from './vocabulary.ts';

/**
 * How many rules hold and mind, as one number: counts of several groups of rules are added up.
 * There are fewer than 32 rules.
 */
export type Counts = number;

const HOLD = 32;
const MIND = 1;

export const holdsIn = (counts: Counts): number => Math.floor(counts / HOLD);
export const mindsIn = (counts: Counts): number => counts % HOLD;

export const verdictOf = (counts: Counts): Verdict =>
  counts >= HOLD ? 'hold' : counts > 0 ? 'mind' : 'pour';

/** Counts where some rules stand on a link, without keeping what they found. */
export function countRules<L extends { rules: HouseRules }>(
  rules: readonly Judge<L>[],
  link: L,
): Counts {
  let counts = 0;
  for (const rule of rules) {
    const { standing } = rule.judge(link);
    if (standing === 'mind') counts += MIND;
    else if (standing === 'hold') counts += link.rules.softened.has(rule.id) ? MIND : HOLD;
  }
  return counts;
}
