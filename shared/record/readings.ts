import type { CakeCheck, CakeCheckWrite, Judgement } from '../api/cakeCheck.ts';
import type { BatchEvent, EventKind, Reading } from '../api/reading.ts';
import type { UnitPrefs } from '../api/units.ts';
import { format } from '../units/quantity.ts';

/** A reading's value with its unit: "1.012", "19.4 °C", "pH 4.3". */
export function readingText({ kind, value }: Pick<Reading, 'kind' | 'value'>, units: UnitPrefs) {
  if (kind === 'ph') return `pH ${Math.round(value * 100) / 100}`;
  return format(kind, value, units);
}

/** A line of the change record on a reading that was added, changed or deleted. */
export function tellReading(
  units: UnitPrefs,
  name: string,
  before: Reading | null,
  after: Reading | null,
): string {
  const text = (one: Reading) => readingText(one, units);
  if (before === null) return after ? `Read ${name} at ${text(after)}` : `Read ${name}`;
  if (after === null) return `Deleted the reading ${text(before)} of ${name}`;
  return text(before) === text(after)
    ? `Changed the reading ${text(after)} of ${name}`
    : `Changed a reading of ${name} from ${text(before)} to ${text(after)}`;
}

export const EVENT_WORDS: Record<EventKind, string> = {
  'dry-hop': 'dry hops',
  addition: 'addition',
  'yeast-taken': 'yeast taken',
  other: 'something done',
};

export function tellEvent(
  name: string,
  before: BatchEvent | null,
  after: BatchEvent | null,
): string {
  const words = (one: BatchEvent) => EVENT_WORDS[one.kind];
  if (after === null) return `Deleted ${before ? words(before) : 'an event'} of ${name}`;
  if (before === null)
    return `${after.doneAt === null ? 'Planned' : 'Noted'} ${words(after)} for ${name}`;
  return before.doneAt === null && after.doneAt !== null
    ? `Noted ${words(after)} for ${name} as done`
    : `Changed ${words(after)} of ${name}`;
}

export const JUDGED_WORDS: Record<Judgement, string> = {
  fit: 'fit',
  'with-care': 'to be used with care',
  unfit: 'unfit',
};

export const tellCheck = (name: string, before: CakeCheck | null, after: CakeCheckWrite): string =>
  before && before.judged === after.judged
    ? `Changed the cake check of ${name}`
    : `Judged the cake of ${name} ${JUDGED_WORDS[after.judged]}`;
