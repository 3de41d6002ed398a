import type { RuleId } from '#shared/rules/vocabulary.ts';

/** The part of the science page on which each rule rests; a rule without a formula has its own entry. */
const SECTIONS: Partial<Record<RuleId, string>> = {
  'light-to-dark': 'colour-difference',
  'mild-to-bitter': 'blending',
  'gravity-jump': 'gravity',
  'strong-before-weak': 'gravity',
  'tired-cake': 'alcohol',
  'cake-wait': 'survival',
  'pitch-amount': 'keep',
  headspace: 'room',
};

export const scienceSectionOf = (rule: RuleId): string => SECTIONS[rule] ?? `rule-${rule}`;
