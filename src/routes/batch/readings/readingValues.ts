import {
  readingCreate,
  type Reading,
  type ReadingCreate,
  type ReadingWrite,
} from '#shared/api/reading.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { newId } from '../../../app/newId.ts';
import { fromLocal, toLocal } from '../../../app/zonedTime.ts';
import type { NumberKind } from '../../../components/form/readers.ts';
import { rewrite, written, type Written } from '../../../components/form/written.ts';

type What = Pick<ReadingCreate, 'kind' | 'method'>;

/** How the shown figure of a reading is read and written. */
export const figureOf = ({ kind, method }: What): NumberKind => {
  if (kind === 'gravity') return method === 'refractometer' ? 'number' : 'gravity';
  return kind === 'temperature' ? 'temperature' : 'number';
};

/** The unit at the field's end, where the figure's own kind has none. */
export const unitShown = ({ kind, method }: What): string | undefined =>
  method === 'refractometer' && kind === 'gravity' ? '°Bx' : kind === 'ph' ? 'pH' : undefined;

/** The same words in another kind of figure: nothing typed is lost. */
export const asFigure = (before: Written, what: What, units: UnitPrefs): Written =>
  rewrite(written(figureOf(what), null, units), before.text, units);

/** What the fields of a reading show at first. */
export function readingValues(
  reading: Reading | null,
  like: Pick<ReadingWrite, 'kind' | 'method' | 'instrumentId'>,
  now: { at: string; timeZone: string },
  units: UnitPrefs,
) {
  const { kind, method, instrumentId } = reading ?? like;
  const typed = reading?.typed ?? {};
  return {
    id: reading?.id ?? newId(),
    kind,
    method: method ?? 'hydrometer',
    takenAt: toLocal(reading?.takenAt ?? now.at, now.timeZone),
    shown: written(figureOf({ kind, method }), reading?.shown ?? null, units, typed.shown),
    sampleC: written('temperature', reading?.sampleC ?? null, units, typed.sampleC),
    instrumentId,
    notes: reading?.notes ?? '',
  };
}

/** The fields as the contract wants them; what does not go with the kind is left out. */
export const readingShape =
  (timeZone: string) =>
  (body: Record<string, unknown>): Record<string, unknown> => {
    const method = body.kind === 'gravity' ? body.method : null;
    return {
      ...body,
      method,
      takenAt: typeof body.takenAt === 'string' ? fromLocal(body.takenAt, timeZone) : null,
      sampleC: method === 'hydrometer' ? body.sampleC : null,
    };
  };

/** The part of a reading that is written again when one of its facts changes. */
export function writeOf(reading: Reading): ReadingWrite {
  const { kind, takenAt, shown, method, sampleC, instrumentId, notes, typed } = reading;
  return { kind, takenAt, shown, method, sampleC, instrumentId, notes, typed };
}

export const readingContract = readingCreate;
