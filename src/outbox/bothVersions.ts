import { capital } from '#shared/rules/words.ts';
import { isRecord } from '../app/isRecord.ts';
import { asTyped } from './asTyped.ts';
import type { Entry } from './entry.ts';

export interface BothVersions {
  label: string;
  mine: string;
  theirs: string;
}

/** Facts that are shown by what was typed, or that say nothing to a reader. */
const UNSHOWN = new Set(['id', 'runId', 'typed', 'version', 'clockOffsetMs', 'instrumentId']);

const LABELS: Record<string, string> = {
  shown: 'Reading',
  sampleC: 'Sample temperature, °C',
  takenAt: 'When',
  text: 'Text',
  notes: 'Notes',
  tasted: 'Tasted',
  judged: 'Judged',
  volumeL: 'Volume, L',
  massKg: 'Mass, kg',
  fullKg: 'Full vessel, kg',
  tareKg: 'Empty vessel, kg',
  og: 'Original gravity',
  c: 'Temperature, °C',
  plannedOn: 'Planned on',
  doneAt: 'Done',
};

/** Field by field what one wrote and what stands on the server, where the two differ. */
export function bothVersions({ body, refusal }: Entry): BothVersions[] {
  const current = refusal?.current;
  if (!isRecord(body) || !isRecord(current)) return [];
  return Object.keys(body)
    .filter((key) => !UNSHOWN.has(key) && key in current)
    .map((key) => ({
      label: LABELS[key] ?? spaced(key),
      mine: wordsOf(body[key], isRecord(body.typed) ? body.typed[key] : undefined),
      theirs: wordsOf(current[key], isRecord(current.typed) ? current.typed[key] : undefined),
    }))
    .filter(({ mine, theirs }) => mine !== theirs);
}

/** Field by field what one wrote. */
export function asWritten({ body }: Entry): Pick<BothVersions, 'label' | 'mine'>[] {
  if (!isRecord(body)) return [];
  const { typed } = body;
  return Object.keys(body)
    .filter((key) => !UNSHOWN.has(key))
    .map((key) => ({
      label: LABELS[key] ?? spaced(key),
      mine: wordsOf(body[key], isRecord(typed) ? typed[key] : undefined),
    }))
    .filter(({ mine }) => mine !== '–');
}

/** "daysUnderBeer" → "Days under beer". */
function spaced(key: string): string {
  const words = key.replace(/([A-Z])/g, (letter) => ` ${letter.toLowerCase()}`);
  return capital(words);
}

function wordsOf(value: unknown, typed: unknown): string {
  const text = asTyped(typed);
  if (text !== null) return text;
  if (value === null || value === undefined || value === '') return '–';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value)) return value.map((one) => wordsOf(one, undefined)).join(', ') || '–';
  if (isRecord(value))
    return Object.entries(value)
      .map(([key, one]) => `${spaced(key).toLowerCase()} ${wordsOf(one, undefined)}`)
      .join(', ');
  return String(value);
}
