import type { RuleId } from '#shared/rules/vocabulary.ts';

/** What each rule looks at, as a brewer would say that it is all right. */
export const RULE_WORDS: Record<RuleId, string> = {
  'same-yeast': 'same yeast',
  'light-to-dark': 'light to dark',
  'mild-to-bitter': 'mild to bitter',
  'hops-in-cake': 'no hops left in the cake',
  'gravity-jump': 'step in gravity',
  'strong-before-weak': 'weak before strong',
  'tired-cake': 'cake not tired',
  'fermentation-temperature': 'fermentation temperature',
  generation: 'generation within the limit',
  'brew-day': 'brew day after racking',
  'cake-wait': 'cake fresh on the day',
  'time-under-beer': 'time under beer',
  'pitch-amount': 'amount of yeast',
  headspace: 'headspace',
  'wild-culture': 'no wild culture',
  allergen: 'allergens declared',
  'flavour-left': 'no flavour left behind',
  'stopped-yeast': 'yeast not stopped',
  'unwashed-vessel': 'vessel clean enough',
  'cake-check': 'cake judged',
};

/** The same rules where they could not be checked. */
export const RULE_QUESTIONS: Record<RuleId, string> = {
  ...RULE_WORDS,
  'hops-in-cake': 'hops in the cake',
  'tired-cake': 'tired cake',
  'brew-day': 'brew day',
  'cake-wait': 'wait of the cake',
  generation: 'generation',
  'wild-culture': 'wild cultures',
  allergen: 'allergens',
  'flavour-left': 'flavours left behind',
  'stopped-yeast': 'stopped yeast',
  'unwashed-vessel': 'cleaning of the vessel',
  'cake-check': 'cake check',
};
