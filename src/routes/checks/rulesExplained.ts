import { HOUSE_RULES as H } from '#shared/rules/houseRules.ts';
import type { RuleId } from '#shared/rules/vocabulary.ts';

export interface RuleExplained {
  id: RuleId;
  title: string;
  /** What is compared. */
  looks: string;
  /** With the limits as they stand by default; absent: the rule never minds or never holds. */
  minds?: string;
  holds?: string;
  basis: string;
}

/** The pour check: what a reading of the wort is held against, a card beside those of the rules. */
export interface PourExplained extends Omit<RuleExplained, 'id'> {
  id: 'wort-temperature';
}

export type Explained = RuleExplained | PourExplained;

const percent = (share: number) => `${Math.round(share * 100)} %`;
const sg = (value: number) => value.toFixed(3);
const d = <K extends keyof typeof H>(key: K): (typeof H)[K]['default'] => H[key].default;

/** Every rule in words, its limits read from the house rules' defaults. */
export const RULES_EXPLAINED: readonly RuleExplained[] = [
  {
    id: 'same-yeast',
    title: 'Same yeast',
    looks: 'Whether the new beer asks for the yeast that its shelf lives on.',
    minds: 'It asks for another yeast of the same kind, and neither has a marked character.',
    holds: 'It asks for another kind, or one of the two can be tasted.',
    basis: 'Common practice.',
  },
  {
    id: 'light-to-dark',
    title: 'Light before dark',
    looks: `How far the beer left in the cake moves the colour of the new one, where the earlier is darker by ${d('darkSrm')} SRM or more.`,
    minds: `The shift can just be seen in a glass of 5 cm: ΔE00 of ${d('colourShiftMind')} or more.`,
    holds: `Anybody would see it: ΔE00 of ${d('colourShiftHold')} or more.`,
    basis:
      'The order is common practice. Colour by the mean spectrum of beer (deLange, in Bamforth 2016, from memory) and CIEDE2000.',
  },
  {
    id: 'mild-to-bitter',
    title: 'Mild before bitter',
    looks: 'How many IBU the beer left in the cake adds.',
    minds: `The earlier beer is bitterer by ${d('bitterGapMind')} IBU and moves the new one by ${d('bitterShiftMind')} or more.`,
    holds: `Bitterer by ${d('bitterGapHold')} and moved by ${d('bitterShiftHold')}, or moved by ${d('bitterShiftAlone')} at all.`,
    basis:
      'Differences are noticed near 6 IBU (Mosher 2009, at second hand); the order is common practice.',
  },
  {
    id: 'hops-in-cake',
    title: 'Hops in the cake',
    looks: `Dry hops that went in before the yeast was taken; bagged hops count ${percent(d('baggedShare'))}.`,
    minds: `More than ${d('hopsMind')} g/L.`,
    holds: `${d('hopsHoldPlain')} g/L and more under a beer without dry hops, or ${d('hopsHold')} g/L and more under any.`,
    basis:
      'Yeast makers advise taking the yeast before dry hopping (Berkeley Yeast); the limits are common practice.',
  },
  {
    id: 'gravity-jump',
    title: 'Step in gravity',
    looks: 'How much stronger the new wort is.',
    minds: `More than ${d('jumpMind')} points; more than ${d('jumpStrong')} is said more strongly.`,
    basis: 'Common practice: no published limit was found, so there is no hold unless you set one.',
  },
  {
    id: 'strong-before-weak',
    title: 'Weak before strong',
    looks: 'How much weaker the new wort is.',
    minds: `${d('fallMind')} points or more below the earlier one.`,
    holds: `${d('fallHold')} points or more below, after a beer of ${sg(d('fallHoldFromOg'))} or more.`,
    basis:
      'Rising strength and flavour: Brew Your Own on repitching yeast; the limits are common practice.',
  },
  {
    id: 'tired-cake',
    title: 'Tired cake',
    looks: 'How hard the earlier beer was on its yeast.',
    minds: `Above ${sg(d('tiredOgMind'))} or ${d('tiredAbvMind')} % alcohol.`,
    holds: `Above ${sg(d('tiredOgHold'))} or ${d('tiredAbvHold')} % alcohol, unless a count finds nine in ten alive.`,
    basis:
      'Dead cells rise with alcohol (Fernández et al. 1985); yeast makers take no cakes from above 18 °P; the lower limits are common practice.',
  },
  {
    id: 'fermentation-temperature',
    title: 'Fermentation temperature',
    looks: "Both beers' first three days against the range of the yeast.",
    minds: `The earlier beer stood outside it, or the new one would by up to ${d('outOfRangeHold')} °C.`,
    holds: `The new one would by more than ${d('outOfRangeHold')} °C.`,
    basis:
      "The yeast's own range. Where none is written down: ale 15–26 °C, lager 5–15 °C (Handbook of Brewing, 3rd ed.).",
  },
  {
    id: 'generation',
    title: 'Generation',
    looks: 'How many beers the yeast has made since the pack.',
    minds: `Above the yeast's own limit, or ${d('generations')}; ${d('generationsFrom15P')} once a beer reached 15 °P and ${d('generationsFrom18P')} once one reached 18 °P.`,
    holds: `More than ${d('holdAfter')} above that.`,
    basis:
      'After strong beers: EEJET 2021, doi 10.15587/1729-4061.2021.248126. Seven to ten otherwise is common practice.',
  },
  {
    id: 'brew-day',
    title: 'Brew day',
    looks: 'Whether the yeast has been taken by then, and on the board whether the vessel is free.',
    holds: 'It has not, or the vessel is not.',
    basis: 'Arithmetic of the dates.',
  },
  {
    id: 'cake-wait',
    title: 'Waiting cake',
    looks:
      'What share of the cells survives between taking and pouring, at the temperature of the wait.',
    minds: `Under ${percent(d('survivalMind'))} survive, or a starter is made of it.`,
    holds: `Under ${percent(d('survivalHold'))}, or more than ${d('warmWaitHoldDays')} days above 12 °C.`,
    basis:
      'Fitted to McCaig and Bendiak 1985: lager slurry of one brewery, up to six days. Its half-life is uncertain by a factor of two and more. Hygiene: common practice.',
  },
  {
    id: 'time-under-beer',
    title: 'Time under beer',
    looks: 'Days from brew day until the yeast is taken.',
    minds: `Before day 5 (lager 10), after ${d('underBeerMind')} (lager ${d('underBeerMindLager')}), or after 21 in a beer above 7 % alcohol.`,
    holds: `After ${d('underBeerHold')} days (lager ${d('underBeerHoldLager')}).`,
    basis:
      'Common practice: nothing published was found for a cake under beer at cellar temperature.',
  },
  {
    id: 'pitch-amount',
    title: 'Amount of yeast',
    looks: 'Living cells in the kept cake against what the wort needs.',
    minds: `Under ${d('pitchMind')} times the need; or ${d('characterMind')} times and more of a yeast with a marked character.`,
    holds: `Under ${d('pitchHold')} times the need.`,
    basis:
      'Need: Fix 1997, at second hand. Growth: White and Zainasheff 2010, uncertain by a factor of 1.8 either way, which is why every cake has an interval.',
  },
  {
    id: 'headspace',
    title: 'Headspace',
    looks: 'Room left in the vessel over wort, cake and what lies above it.',
    minds: `Under ${percent(d('freeMind'))} of the wort; ${percent(d('freeMindStrong'))} from 1.065; ${percent(d('freeBlowOff'))} with a blow-off tube.`,
    holds: `Under ${percent(d('freeHold'))}.`,
    basis: 'Common practice; a published plant left 25 % above its ales (Shardlow 1972).',
  },
  {
    id: 'wild-culture',
    title: 'Wild cultures',
    looks:
      'Bacteria, Brettanomyces, diastatic yeast or an added enzyme in any earlier beer of the chain.',
    holds: 'One of them is not declared on the new beer. This cannot be accepted away.',
    basis:
      'Zero tolerance for diastatic yeast: Meier-Dörnberg et al. 2017, at second hand; the rest is common practice.',
  },
  {
    id: 'allergen',
    title: 'Allergens',
    looks: 'What was in any earlier beer of the chain, whatever the dilution.',
    holds: 'It is not declared on the new beer. This cannot be accepted away.',
    basis: 'The fourteen groups of Regulation (EU) No 1169/2011, Annex II. Labelling law is local.',
  },
  {
    id: 'flavour-left',
    title: 'Flavours left behind',
    looks: 'Things put in before the yeast was taken that the new beer does not have.',
    minds: 'Fruit, spice, coffee, vanilla, wood or lactose.',
    holds: 'Smoke or chilli.',
    basis: 'Common practice.',
  },
  {
    id: 'stopped-yeast',
    title: 'Stopped yeast',
    looks: 'Whether the yeast was stopped on purpose.',
    holds: 'Metabisulphite or sorbate went in before it was taken.',
    basis: 'Common practice.',
  },
  {
    id: 'unwashed-vessel',
    title: 'Unwashed vessel',
    looks: 'How many beers stood in the vessel since it was cleaned.',
    minds: `It would be beer number ${d('beersSinceCleaning')} or later. Where no cleaning is written down, nothing is said.`,
    basis: 'Common practice.',
  },
  {
    id: 'cake-check',
    title: 'Judged cake',
    looks: 'Whether somebody has looked at, smelled and tasted above the cake, on the board only.',
    minds:
      'The pour is due within a day and nobody has; or it was judged with care; or more than 10 % of the cells are dead.',
    holds: 'It was judged unfit, tasted off, its fermentation stuck, or more than 25 % are dead.',
    basis: 'Common practice; plants aim below 2 % dead and exclude from 5 % (MEBAK M-350.18.518).',
  },
];

export const POUR_EXPLAINED: PourExplained = {
  id: 'wort-temperature',
  title: 'Wort temperature',
  looks: 'Each reading of the wort on the brew day, against the window of its yeast.',
  minds: `Up to ${d('pourAboveMind')} °C above the window or ${d('pourBelowMind')} °C below it, or a cake more than ${d('warmerCakeMind')} °C warmer than the wort.`,
  holds: `Further out, no reading of the last ${d('readingMinutes')} minutes, or so warm that it kills the yeast, which nobody can override.`,
  basis:
    "The yeast's own range, else the usual range of its kind. Where growth ends: Handbook of Brewing, 3rd ed. The other limits are common practice.",
};

/** Every card of limits, in the order in which a link and then its pour are looked at. */
export const ALL_EXPLAINED: readonly Explained[] = [...RULES_EXPLAINED, POUR_EXPLAINED];
