import type { Day, RuleId, Verdict } from './vocabulary.ts';

export interface Measure {
  label: string;
  value: number;
  /** `SG`, `points`, `SRM`, `IBU`, `ΔE00`, `°C`, `L`, `%`, `g/L`, `days`, `× need`, or empty. */
  unit: string;
  limit: number | null;
}

export interface Finding {
  rule: RuleId;
  verdict: Exclude<Verdict, 'pour'>;
  /** Two to four trade words, also used as the short reason under a band. */
  title: string;
  because: string;
  do: string;
  measures: Measure[];
  basis: string;
}

export interface Unchecked {
  rule: RuleId;
  /** Names of the fields that are missing, as in the check contract, e.g. `ibu`. */
  missing: string[];
}

export interface Advice {
  id: string;
  text: string;
}

/** low and high bound the 90 % interval. */
export interface Interval {
  low: number;
  likely: number;
  high: number;
}

/** The engine's answer for one link. Figures that cannot be computed are null. */
export interface LinkAnswer {
  from: string;
  to: string;
  verdict: Verdict;
  generation: number | null;
  takenOn: Day | null;
  waitDays: number | null;
  findings: Finding[];
  passed: RuleId[];
  unchecked: Unchecked[];
  advice: Advice[];
  blend: { og: number | null; srm: number | null; ibu: number | null; deltaE00: number | null };
  cake: {
    viableCells: Interval | null;
    volumeL: number | null;
    massKg: number | null;
    /** 90 % interval of the volume, litres. */
    volumeInterval: Interval | null;
    measured: boolean;
  };
  need: { viableCells: number | null };
  keep: {
    keptL: number | null;
    ratio: number | null;
    recommendedL: number | null;
    recommendedKg: number | null;
    /** The trade's rule of thumb by weight of slurry, kg (common practice). */
    thumbKg: { low: number; high: number } | null;
  };
}
