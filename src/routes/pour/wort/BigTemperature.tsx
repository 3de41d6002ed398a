import { format, formatBare, unitOf } from '#shared/units/quantity.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { ago } from '../words.ts';

/** The last reading, to be read at arm's length, beside the window and where that comes from. */
export function BigTemperature() {
  const { standing, now } = usePourView();
  const { units } = useBoardView();
  const { readingC, readAt, window: pourWindow } = standing.wort;
  const from = formatBare('temperature', pourWindow.minC, units);
  const to = format('temperature', pourWindow.maxC, units);
  return (
    <div>
      <div className="mt-3 flex flex-wrap items-end gap-x-5 gap-y-1">
        <p className="font-display text-[4.75rem] leading-[.9] font-bold tracking-[-.04em] tabular-nums">
          {readingC === null ? '–' : formatBare('temperature', readingC, units).replace('-', '−')}
          <span className="text-[1.6rem] font-medium tracking-normal">
            {' '}
            {unitOf('temperature', units)}
          </span>
        </p>
        <p className="pb-1 leading-tight text-ink2">
          pour between
          <b className="block text-shelf text-ink">
            {from} and {to}
          </b>
        </p>
      </div>
      <p className="mt-1.5 text-body text-ink2">
        {readAt === null ? 'Nothing read yet' : `Read ${ago(readAt, now)}`} ·{' '}
        {pourWindow.own
          ? 'the yeast’s own range'
          : 'usual for this kind of yeast; its maker’s own range goes first'}
      </p>
    </div>
  );
}
