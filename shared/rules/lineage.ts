import { allergen } from './allergen.ts';
import { generationRule } from './generation.ts';
import type { Lineage } from './linkState.ts';
import { wildCulture } from './wild-culture.ts';

/**
 * Where the rules on descent stand, as one text. Two links that differ in generation and
 * inheritance alone have the same verdict, holds and minds where these texts are the same.
 */
export const lineageStanding = (link: Lineage): string =>
  `${generationRule.judge(link).standing} ${allergen.judge(link).standing} ${wildCulture.judge(link).standing}`;
