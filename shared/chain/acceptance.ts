import type { Acceptance } from '../api/batch.ts';
import type { LinkAnswer } from '../rules/answer.ts';
import type { RuleId } from '../rules/vocabulary.ts';

/** Holds that nobody may take on: the way out is to declare it, or to use a larger vessel. */
export const NEVER_ACCEPTED: readonly RuleId[] = ['allergen', 'wild-culture', 'headspace'];

/** The rules that hold a link. */
export const holdsOf = (answer: Pick<LinkAnswer, 'findings'>): RuleId[] =>
  answer.findings.filter(({ verdict }) => verdict === 'hold').map(({ rule }) => rule);

/** True of a link that holds and of which every hold may be taken on. */
export function mayBeAccepted(answer: Pick<LinkAnswer, 'findings'>): boolean {
  const holds = holdsOf(answer);
  return holds.length > 0 && !holds.some((rule) => NEVER_ACCEPTED.includes(rule));
}

/** True where every hold of the link was taken on: a new hold needs a new acceptance. */
export const isAccepted = (
  answer: Pick<LinkAnswer, 'findings'>,
  acceptance: Acceptance | null,
): boolean =>
  acceptance !== null &&
  mayBeAccepted(answer) &&
  holdsOf(answer).every((rule) => acceptance.rules.includes(rule));
