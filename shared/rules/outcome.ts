import type { Measure } from './answer.ts';
import type { LinkState } from './linkState.ts';
import type { Say } from './say.ts';
import type { RuleId } from './vocabulary.ts';

/** What a rule finds, before any sentence is written. `D` holds the figures that decided. */
export interface Flagged<D> {
  standing: 'mind' | 'hold';
  detail: D;
}

/**
 * Where a rule stands on a link. A rule speaks as soon as the known facts already decide for at
 * least a mind; it is unchecked only where nothing known speaks and something unknown could.
 * `nowhere`: the rule needs the board or a record that there is not.
 */
export type Outcome<D> =
  | Flagged<D>
  | { standing: 'passed' }
  | { standing: 'unchecked'; missing: string[] }
  | { standing: 'nowhere' };

export interface Sentences {
  title: string;
  because: string;
  do: string;
  measures: Measure[];
  basis: string;
}

/** The part of a rule that says where it stands, from as much of a link as it reads. */
export interface Judge<L> {
  readonly id: RuleId;
  judge(link: L): Outcome<unknown>;
}

/** One rule. `judge` is cheap and writes nothing; `describe` is asked only for what it found. */
export interface Rule<D> {
  readonly id: RuleId;
  judge(link: LinkState): Outcome<D>;
  describe(found: Flagged<D>, link: LinkState, say: Say): Sentences;
}

export const PASSED = { standing: 'passed' } as const;
export const NOWHERE = { standing: 'nowhere' } as const;
export const mind = <D>(detail: D): Flagged<D> => ({ standing: 'mind', detail });
export const hold = <D>(detail: D): Flagged<D> => ({ standing: 'hold', detail });
export const unchecked = (missing: string[]) => ({ standing: 'unchecked', missing }) as const;

export const measure = (
  label: string,
  value: number,
  unit: string,
  limit: number | null = null,
): Measure => ({ label, value, unit, limit });
