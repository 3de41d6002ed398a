import clsx from 'clsx';
import type { Day } from '#shared/rules/vocabulary.ts';
import { formatDay, formatDayShort } from '#shared/units/day.ts';

interface DateTagProps {
  day: Day | null;
  /** What only would be. */
  dashed?: boolean;
  /** Words in place of a day. */
  text?: string;
  large?: boolean;
}

/** A tag that hangs on its thread from the shelf's edge. */
export function DateTag({ day, dashed = false, text, large = false }: DateTagProps) {
  return (
    <span
      className={clsx(
        'relative inline-block rounded-t-tag rounded-b-tag-foot border border-edge px-2.5 pt-0.5 pb-[3px] font-bold whitespace-nowrap',
        'before:absolute before:-top-2 before:left-1/2 before:h-2 before:border-l-[1.5px] before:border-edge',
        dashed ? 'border-dashed bg-stone text-ink2' : 'bg-white shadow-tag',
        large ? 'text-small' : 'text-label',
      )}
    >
      {day === null ? (
        <span className="font-normal text-ink2">{text ?? 'no date'}</span>
      ) : (
        <time dateTime={day} title={formatDay(day)}>
          {text ?? formatDayShort(day)}
        </time>
      )}
    </span>
  );
}
