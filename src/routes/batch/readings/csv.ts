import type { Instrument, Reading } from '#shared/api/reading.ts';
import { toLocal } from '../../../app/zonedTime.ts';

const UNITS: Record<Reading['kind'], string> = { gravity: 'SG', temperature: '°C', ph: 'pH' };

/**
 * All readings as comma-separated text, oldest first, in stored units. Text that a table program
 * would take for a formula is made harmless.
 */
export async function readingsCsv(
  readings: readonly Reading[],
  instruments: readonly Instrument[],
  timeZone: string,
): Promise<string> {
  const { unparse } = (await import('papaparse')).default;
  const nameOf = (id: string | null) => instruments.find((one) => one.id === id)?.name ?? '';
  const rows = readings.map((one) => ({
    when: toLocal(one.takenAt, timeZone).replace('T', ' '),
    'when (UTC)': one.takenAt,
    what: one.kind,
    value: one.value,
    unit: UNITS[one.kind],
    'as shown': one.shown,
    'read by': one.method ?? '',
    'sample °C': one.sampleC ?? '',
    instrument: nameOf(one.instrumentId),
    note: one.notes,
    by: one.by.name,
  }));
  return unparse(rows, { escapeFormulae: true, newline: '\r\n' });
}

/** Hands text over as a file. */
export function saveFile(name: string, text: string): void {
  const url = URL.createObjectURL(new Blob(['\ufeff', text], { type: 'text/csv;charset=utf-8' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  URL.revokeObjectURL(url);
}
