import type { UnitPrefs } from '../api/units.ts';
import type {
  BatchFacts,
  BoardContext,
  Inheritance,
  PourFacts,
  VesselFacts,
  YeastFacts,
} from './facts.ts';
import type { HouseRules } from './resolve.ts';

/** Everything that one link is judged by: the cake of `earlier` under the wort of `later`. */
export interface LinkInput {
  earlier: BatchFacts;
  later: BatchFacts;
  pour: PourFacts;
  yeast: YeastFacts;
  /** The chain's vessel; the pour may name another. */
  vessel?: VesselFacts;
  /** Generation of the later batch. */
  generation?: number;
  inherited: Inheritance;
  rules: HouseRules;
  board?: BoardContext;
  /** How numbers are written in sentences; metric, SG, SRM and °C where absent. */
  units?: UnitPrefs;
  /** The earlier batch was itself poured onto a whole cake (advice only). */
  wholeCakeBefore?: boolean;
}
