import type { HouseRuleKey } from '#shared/rules/houseRules.ts';
import type { Explained } from '../checks/rulesExplained.ts';

/** A sentence of a rule: words, and the limits that stand among them. */
export type Sentence = readonly (string | { limit: HouseRuleKey; empty?: string })[];

const n = (limit: HouseRuleKey) => ({ limit });

/** The rules whose numbers a brewery may change, each in the words of its own. */
export const RULE_SENTENCES: Partial<Record<Explained['id'], readonly Sentence[]>> = {
  'light-to-dark': [
    [
      'A beer darker by',
      n('darkSrm'),
      'or more is a Mind when the kept cake moves the colour by',
      n('colourShiftMind'),
      'and a Hold from',
      n('colourShiftHold'),
    ],
  ],
  'mild-to-bitter': [
    [
      'A beer bitterer by',
      n('bitterGapMind'),
      'or more is a Mind when the kept cake adds',
      n('bitterShiftMind'),
    ],
    ['It is a Hold when it is bitterer by', n('bitterGapHold'), 'and adds', n('bitterShiftHold')],
    ['It is a Hold at any gap when it adds', n('bitterShiftAlone')],
  ],
  'hops-in-cake': [
    ['Hops that went in before the yeast was taken are a Mind above', n('hopsMind')],
    [
      'They are a Hold from',
      n('hopsHoldPlain'),
      'under a beer without dry hops, and from',
      n('hopsHold'),
      'under any',
    ],
    ['Bagged hops count', n('baggedShare'), 'of loose ones'],
  ],
  'gravity-jump': [
    [
      'A wort stronger by more than',
      n('jumpMind'),
      'is a Mind, and by more than',
      n('jumpStrong'),
      'it is said more strongly',
    ],
    ['It is a Hold above', { limit: 'jumpHold', empty: 'never' }],
  ],
  'strong-before-weak': [
    ['A wort weaker by', n('fallMind'), 'or more is a Mind'],
    ['It is a Hold from', n('fallHold'), 'after a beer of', n('fallHoldFromOg'), 'or more'],
  ],
  'tired-cake': [
    ['After a beer above', n('tiredOgMind'), 'or', n('tiredAbvMind'), 'alcohol the cake is a Mind'],
    [
      'Above',
      n('tiredOgHold'),
      'or',
      n('tiredAbvHold'),
      'alcohol it is a Hold, unless a count finds nine in ten alive',
    ],
  ],
  'fermentation-temperature': [
    [
      'A beer that ferments outside the range of the yeast is a Mind, and by more than',
      n('outOfRangeHold'),
      'a Hold',
    ],
  ],
  generation: [
    [
      'A beer is a Mind past generation',
      n('generations'),
      'past',
      n('generationsFrom15P'),
      'once a beer reached 15 °P, and past',
      n('generationsFrom18P'),
      'once one reached 18 °P',
    ],
    ['It is a Hold more than', n('holdAfter'), 'past that'],
  ],
  'cake-wait': [
    [
      'A cake is a Mind when under',
      n('survivalMind'),
      'of its cells live until the pour, and a Hold under',
      n('survivalHold'),
    ],
    ['It is a Hold after more than', n('warmWaitHoldDays'), 'above 12 °C'],
  ],
  'time-under-beer': [
    [
      'A cake is a Mind after',
      n('underBeerMind'),
      'under ale and a Hold after',
      n('underBeerHold'),
    ],
    [
      'It is a Mind after',
      n('underBeerMindLager'),
      'under lager and a Hold after',
      n('underBeerHoldLager'),
    ],
  ],
  'pitch-amount': [
    ['Living cells are a Mind under', n('pitchMind'), 'and a Hold under', n('pitchHold')],
    ['Of a yeast with a marked character they are a Mind from', n('characterMind'), 'on'],
  ],
  headspace: [
    [
      'Free room under',
      n('freeMind'),
      'of the wort is a Mind; from 1.065 under',
      n('freeMindStrong'),
      'and with a blow-off tube under',
      n('freeBlowOff'),
    ],
    ['It is a Hold under', n('freeHold')],
    ['Where it was not measured,', n('leftAboveShare'), 'of a beer is taken to lie above its cake'],
  ],
  'unwashed-vessel': [
    ['A vessel is a Mind at beer number', n('beersSinceCleaning'), 'since it was cleaned'],
  ],
  'wort-temperature': [
    ['Wort above its window is a Mind up to', n('pourAboveMind'), 'and a Hold further up'],
    ['Wort below it is a Mind up to', n('pourBelowMind'), 'and a Hold further down'],
    ['A cake warmer than the wort by more than', n('warmerCakeMind'), 'is a Mind'],
    ['A reading counts for', n('readingMinutes')],
  ],
};
