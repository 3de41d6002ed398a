import { allergen } from './allergen.ts';
import { brewDay } from './brew-day.ts';
import { cakeCheck } from './cake-check.ts';
import { cakeWait } from './cake-wait.ts';
import { fermentationTemperature } from './fermentation-temperature.ts';
import { flavourLeft } from './flavour-left.ts';
import { generationRule } from './generation.ts';
import { gravityJump } from './gravity-jump.ts';
import { headspace } from './headspace.ts';
import { hopsInCake } from './hops-in-cake.ts';
import { lightToDark } from './light-to-dark.ts';
import { mildToBitter } from './mild-to-bitter.ts';
import type { Lineage, VesselDays } from './linkState.ts';
import type { Judge, Rule } from './outcome.ts';
import { pitchAmount } from './pitch-amount.ts';
import { sameYeast } from './same-yeast.ts';
import { stoppedYeast } from './stopped-yeast.ts';
import { strongBeforeWeak } from './strong-before-weak.ts';
import { timeUnderBeer } from './time-under-beer.ts';
import { tiredCake } from './tired-cake.ts';
import { unwashedVessel } from './unwashed-vessel.ts';
import { wildCulture } from './wild-culture.ts';

/** The rules that read the line of beers before, and of the two beers only what is declared. */
export const DESCENT_RULES: readonly Judge<Lineage>[] = [allergen, wildCulture, generationRule];

/** The rules that read who else was brewed in the vessel, and when. */
export const VESSEL_RULES: readonly Judge<VesselDays>[] = [brewDay, unwashedVessel];

/** Every rule, in the order in which findings of one verdict are told. */
export const RULES: readonly Rule<unknown>[] = [
  allergen,
  wildCulture,
  stoppedYeast,
  sameYeast,
  brewDay,
  cakeCheck,
  hopsInCake,
  tiredCake,
  lightToDark,
  mildToBitter,
  strongBeforeWeak,
  gravityJump,
  fermentationTemperature,
  pitchAmount,
  headspace,
  cakeWait,
  timeUnderBeer,
  generationRule,
  flavourLeft,
  unwashedVessel,
];

const OTHERS = [...DESCENT_RULES, ...VESSEL_RULES].map(({ id }) => id);

/** The rules that read nothing but two beers, the pour between them, their yeast and vessel. */
export const PAIR_RULES = RULES.filter((rule) => !OTHERS.includes(rule.id));
