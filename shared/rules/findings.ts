import type { Finding, Unchecked } from './answer.ts';
import type { LinkState } from './linkState.ts';
import { RULES } from './list.ts';
import type { Flagged, Rule } from './outcome.ts';
import type { Say } from './say.ts';
import type { RuleId } from './vocabulary.ts';

export interface Found {
  rule: Rule<unknown>;
  verdict: 'mind' | 'hold';
  flagged: Flagged<unknown>;
}

/** Where every rule stands on a link; each rule in one list at most. */
export interface Standings {
  /** Worst first, else in the order of the rules. */
  found: Found[];
  holds: number;
  minds: number;
  passed: RuleId[];
  unchecked: Unchecked[];
}

export function judgeRules(link: LinkState): Standings {
  const holds: Found[] = [];
  const minds: Found[] = [];
  const passed: RuleId[] = [];
  const unchecked: Unchecked[] = [];
  for (const rule of RULES) {
    const outcome = rule.judge(link);
    switch (outcome.standing) {
      case 'passed':
        passed.push(rule.id);
        break;
      case 'unchecked':
        unchecked.push({ rule: rule.id, missing: outcome.missing });
        break;
      case 'hold':
        if (link.rules.softened.has(rule.id))
          minds.push({ rule, verdict: 'mind', flagged: outcome });
        else holds.push({ rule, verdict: 'hold', flagged: outcome });
        break;
      case 'mind':
        minds.push({ rule, verdict: 'mind', flagged: outcome });
        break;
      case 'nowhere':
        break;
    }
  }
  const found = [...holds, ...minds];
  return { found, holds: holds.length, minds: minds.length, passed, unchecked };
}

export function write({ rule, verdict, flagged }: Found, link: LinkState, say: Say): Finding {
  const said = rule.describe(flagged, link, say);
  return {
    rule: rule.id,
    verdict,
    title: said.title,
    because: said.because,
    do: said.do,
    measures: said.measures,
    basis: said.basis,
  };
}
