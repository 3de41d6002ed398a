import { checkLink, type LinkInput } from '#shared/chain/checkLink.ts';
import { NOTHING_INHERITED } from '#shared/chain/inherit.ts';
import type { LinkAnswer } from '#shared/rules/answer.ts';
import type { BatchFacts, PourFacts, YeastFacts } from '#shared/rules/facts.ts';
import { DEFAULT_HOUSE_RULES, type HouseRules } from '#shared/rules/resolve.ts';
import type { RuleId } from '#shared/rules/vocabulary.ts';
import { addDays } from '#shared/units/day.ts';

/** The yeasts, beers and links that the tests of the rules begin with. */

export const CLEAN_ALE: YeastFacts = {
  kind: 'ale',
  character: false,
  fermentMinC: 18,
  fermentMaxC: 22,
  generationLimit: 7,
};
export const PALE_LAGER: YeastFacts = {
  kind: 'lager',
  character: false,
  fermentMinC: 8,
  fermentMaxC: 14,
  generationLimit: 7,
};

/** Final gravity at a quarter of the original's points. */
export const quarter = (og: number): number => 1 + (og - 1) / 4;

/** An ale of which everything is known: 23 L at 20 °C for 14 days, nothing added. */
export function ale(id: string, og: number, srm: number, ibu: number): BatchFacts {
  return {
    id,
    volumeL: 23,
    og,
    fg: quarter(og),
    srm,
    ibu,
    fermentC: 20,
    daysUnderBeer: 14,
    brewOn: '2027-03-06',
    dryHops: [],
    additions: [],
    allergens: [],
    cultures: [],
    trub: 'some',
  };
}

/** A lager of which everything is known: 23 L at 11 °C for 24 days. */
export const lager = (id: string, og: number, srm: number, ibu: number): BatchFacts => ({
  ...ale(id, og, srm, ibu),
  fermentC: 11,
  daysUnderBeer: 24,
});

export const blonde = (): BatchFacts => ale('blonde', 1.044, 4, 20);
export const paleAle = (): BatchFacts => ale('pale', 1.052, 7, 38);

export interface Case {
  a: BatchFacts;
  b: BatchFacts;
  pour?: PourFacts;
  yeast?: YeastFacts;
  rules?: Partial<HouseRules>;
  rest?: Partial<LinkInput>;
}

/** B is brewed on A's racking day unless the case says otherwise. */
export function linkInput({ a, b, pour = {}, yeast = CLEAN_ALE, rules, rest }: Case): LinkInput {
  return {
    earlier: a,
    later: b,
    pour,
    yeast,
    vessel: { capacityL: 32, blowOff: false },
    generation: 2,
    inherited: NOTHING_INHERITED,
    rules: { ...DEFAULT_HOUSE_RULES, ...rules },
    ...rest,
  };
}

export const onRackingDay = (a: BatchFacts, b: BatchFacts): BatchFacts =>
  a.brewOn === undefined || a.daysUnderBeer === undefined
    ? b
    : { ...b, brewOn: addDays(a.brewOn, a.daysUnderBeer) };

/** The answer, with B brewed on A's racking day. */
export const check = (of: Case): LinkAnswer =>
  checkLink(linkInput({ ...of, b: onRackingDay(of.a, of.b) }));

export const checkAsDated = (of: Case): LinkAnswer => checkLink(linkInput(of));

export type Standing = 'hold' | 'mind' | 'passed' | 'unchecked' | 'nowhere';

/** Where a rule stands in an answer. */
export function standing(answer: LinkAnswer, rule: RuleId): Standing {
  const found = answer.findings.find((one) => one.rule === rule);
  if (found) return found.verdict;
  if (answer.passed.includes(rule)) return 'passed';
  return answer.unchecked.some((one) => one.rule === rule) ? 'unchecked' : 'nowhere';
}

export const missingFor = (answer: LinkAnswer, rule: RuleId): string[] =>
  answer.unchecked.find((one) => one.rule === rule)?.missing ?? [];

/** `hold tired-cake`, sorted. */
export const findings = (answer: LinkAnswer): string[] =>
  answer.findings.map((one) => `${one.verdict} ${one.rule}`).sort();
