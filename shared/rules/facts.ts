import type {
  AdditionKind,
  Allergen,
  Culture,
  Day,
  HopContainment,
  Timing,
  TrubLevel,
  YeastKind,
} from './vocabulary.ts';

/**
 * What the engine is told of a batch. An absent key is unknown; the rules that need it are then
 * unchecked, unless what is known already decides. Units: litres, SG, SRM, IBU, °C, days.
 * Measured facts stand here in place of planned ones where there are any; never blended ones.
 */
export interface BatchFacts {
  id: string;
  name?: string;
  volumeL?: number;
  og?: number;
  fg?: number;
  srm?: number;
  ibu?: number;
  /** Temperature of the first three days, °C. */
  fermentC?: number;
  daysUnderBeer?: number;
  brewOn?: Day;
  /** Empty: none. Absent: unknown. */
  dryHops?: readonly DryHop[];
  additions?: readonly Addition[];
  allergens?: readonly Allergen[];
  cultures?: readonly Culture[];
  /** Default `some`. */
  trub?: TrubLevel;
  /** Facts of the cake that were weighed, measured or counted; each replaces its estimate. */
  measuredCake?: MeasuredCake;
}

export interface DryHop {
  gramsPerLitre: number;
  contained: HopContainment;
  timing: Timing;
}

export interface Addition {
  what: AdditionKind;
  timing: Timing;
}

export interface MeasuredCake {
  volumeL?: number;
  massKg?: number;
  /** Living share of a cell count, 0–1. */
  viability?: number;
  cellsPerMl?: number;
}

/** What is known of the pour itself: how A's cake goes under B. Absent keys are unknown. */
export interface PourFacts {
  /** The day the yeast was taken from A; absent: at racking. */
  takenOn?: Day;
  /** Part of the cake that is kept, litres; `recommended`: see `keep`; absent: the whole cake. */
  keepL?: number | 'recommended';
  /** Beer left above the cake, litres; absent: the house rule's share of A's volume. */
  leftAboveL?: number;
  /** Temperature at which the cake waits, °C; absent: A's fermentation temperature. */
  cakeC?: number;
  /** A starter is made from the waiting cake. */
  starter?: boolean;
  /** B asks for this yeast instead of the chain's. */
  otherYeast?: { kind: YeastKind; character?: boolean };
  /** B would be the nth beer since the vessel was cleaned; absent: no cleaning is recorded. */
  beersSinceCleaning?: number;
  /** B's own vessel; absent: the chain's. */
  vessel?: VesselFacts;
  /** Parts of the same cake that go under other worts; absent: none. */
  sharedWith?: readonly SharedPart[];
}

export interface SharedPart {
  /** The wort that gets it. */
  name: string;
  litres: number;
}

export interface YeastFacts {
  kind: YeastKind;
  /** Marked character: phenolic, estery, a yeast one would taste. Absent: unknown. */
  character?: boolean;
  fermentMinC?: number;
  fermentMaxC?: number;
  pourMinC?: number;
  pourMaxC?: number;
  neverAboveC?: number;
  generationLimit?: number;
}

export interface VesselFacts {
  capacityL?: number;
  blowOff?: boolean;
}

/** What the earlier beers on this yeast hand down, A included. */
export interface Inheritance {
  allergens: readonly Allergen[];
  cultures: readonly Culture[];
  /** Highest original gravity of the beers before B, A included, if any is known. */
  strongestOg?: number;
  /** True where a beer before B was brewed at an unknown original gravity. */
  ogUnknown?: boolean;
  /** True where an earlier beer's allergens (or cultures) are unknown. */
  allergensUnknown?: boolean;
  culturesUnknown?: boolean;
}

/** Facts that only the board knows. Their rules stand nowhere off the board. */
export interface BoardContext {
  /** Name of the batch that still occupies B's vessel on the brew day, if any. */
  vesselTakenBy?: string;
  /** Judgement of the cake at racking, and whether the pour is due within a day. */
  cakeCheck?: {
    dueWithinADay: boolean;
    judged?: 'fit' | 'with-care' | 'unfit';
    /** Dead share of a cell count, 0–1. */
    dead?: number;
    tastedOff?: boolean;
    fermentationStuck?: boolean;
    /** What the readings of the beer above it warn of, a sentence each. */
    noticed?: readonly string[];
  };
}
