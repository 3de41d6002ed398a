import type { TodayFacts } from '../api/today.ts';
import type { BoardFacts } from '../chain/board.ts';
import type { Day } from '../rules/vocabulary.ts';
import { addDays } from '../units/day.ts';
import { dutiesOf } from './duties.ts';
import type { Duty } from './duty.ts';

/** Days after today that "this week" reaches. */
export const WEEK_DAYS = 6;

export interface TodayList {
  today: Day;
  /** Due today or before: what waits for an answer first, then what is latest. */
  due: Duty[];
  /** In the six days after. A reading stands there only on the day that it is due. */
  week: Duty[];
  /** Where both are empty: what comes next, and when; null: nothing is planned. */
  next: Duty | null;
}

/** Kinds that somebody else waits for: before everything else. */
const URGENT: ReadonlySet<Duty['kind']> = new Set(['override', 'pour-open', 'signature']);

/**
 * What is to be done on a day of the brewery and in the week after.
 * @param today the day there, `YYYY-MM-DD`: by `dayIn`, not by the clock of whoever looks
 */
export function todayList(
  board: BoardFacts & { brewery: { timeZone: string } },
  facts: TodayFacts,
  today: Day,
): TodayList {
  const duties = dutiesOf(board, facts, board.brewery.timeZone);
  const last = addDays(today, WEEK_DAYS);
  const due = duties.filter(({ day }) => day <= today);
  const week = duties.filter(({ day }) => day > today && day <= last);
  const next = duties.find(({ day, kind }) => day > last && kind !== 'reading') ?? null;
  const isEmpty = due.length === 0 && week.length === 0;
  return {
    today,
    due: [
      ...due.filter(({ kind }) => URGENT.has(kind)),
      ...due.filter(({ kind }) => !URGENT.has(kind)),
    ],
    week,
    next: isEmpty ? next : null,
  };
}
