import { NOTHING_INHERITED } from '#shared/chain/inherit.ts';
import type { BatchFacts } from '#shared/rules/facts.ts';
import type { LinkInput } from '#shared/rules/linkInput.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';

/** A plain ale of 23 L, fourteen days under beer at 20 °C. */
export const ale = (own: Partial<BatchFacts> & { id: string }): BatchFacts => ({
  volumeL: 23,
  fermentC: 20,
  daysUnderBeer: 14,
  dryHops: [],
  additions: [],
  allergens: [],
  cultures: [],
  ...own,
});

/** The whole cake of one under the other, in a vessel of 32 L. */
export const linkOf = (earlier: BatchFacts, later: BatchFacts): LinkInput => ({
  earlier,
  later,
  pour: {},
  yeast: { kind: 'ale', character: false, fermentMinC: 18, fermentMaxC: 22 },
  vessel: { capacityL: 32, blowOff: false },
  generation: 2,
  inherited: NOTHING_INHERITED,
  rules: DEFAULT_HOUSE_RULES,
});
