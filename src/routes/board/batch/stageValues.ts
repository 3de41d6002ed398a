import type { Batch, Stage } from '#shared/api/batch.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import type { BoardIndex } from '#shared/chain/board.ts';
import { rackDay, takenDay } from '#shared/chain/dates.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import { written } from '../../../components/form/written.ts';

/** What happened cannot lie in the future. */
const notAfter = (day: Day | null, today: Day): Day => (day === null || day > today ? today : day);

/** The readings, else the plan's figures, as a start for what was read; a day in the future becomes today. */
export function stageValues(
  batch: Batch,
  to: Stage,
  today: Day,
  index: BoardIndex,
  units: UnitPrefs,
): Record<string, unknown> {
  const number = (kind: 'volume' | 'gravity', value: number | null) => written(kind, value, units);
  switch (to) {
    case 'pencilled':
      return { stage: to };
    case 'fermenting': {
      const before = index.predecessor(batch.id);
      const due = batch.brewOn ?? (before ? takenDay(before, batch) : null);
      return {
        stage: to,
        brewedOn: notAfter(due, today),
        volumeL: number('volume', batch.read.volumeL ?? batch.volumeL),
        og: number('gravity', batch.read.og ?? batch.followed?.firstGravity ?? batch.og),
      };
    }
    case 'racked':
      return {
        stage: to,
        rackedOn: notAfter(rackDay(batch), today),
        volumeL: number('volume', batch.read.volumeL ?? batch.volumeL),
        fg: number('gravity', batch.read.fg ?? batch.followed?.gravity ?? batch.fg),
      };
    case 'scrapped':
      return { stage: to, reason: '' };
  }
}
