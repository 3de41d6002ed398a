import type { RuleId } from './vocabulary.ts';

/** What each rule is called. */
export const RULE_NAMES: Record<RuleId, string> = {
  'same-yeast': 'Same yeast',
  'light-to-dark': 'Light before dark',
  'mild-to-bitter': 'Mild before bitter',
  'hops-in-cake': 'Hops in the cake',
  'gravity-jump': 'Step in gravity',
  'strong-before-weak': 'Weak before strong',
  'tired-cake': 'Tired cake',
  'fermentation-temperature': 'Fermentation temperature',
  generation: 'Generation',
  'brew-day': 'Brew day',
  'cake-wait': 'Waiting cake',
  'time-under-beer': 'Time under beer',
  'pitch-amount': 'Amount of yeast',
  headspace: 'Headspace',
  'wild-culture': 'Wild cultures',
  allergen: 'Allergens',
  'flavour-left': 'Flavours left behind',
  'stopped-yeast': 'Stopped yeast',
  'unwashed-vessel': 'Unwashed vessel',
  'cake-check': 'Judged cake',
};
