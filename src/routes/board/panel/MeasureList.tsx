import type { Measure } from '#shared/rules/answer.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { measureText } from './measureWords.ts';

/** The numbers that were compared, each with its limit. */
export function MeasureList({ measures }: { measures: readonly Measure[] }) {
  const { units } = useBoardView();
  if (measures.length === 0) return null;
  return (
    <dl className="mt-2 grid gap-y-1 rounded-lg bg-line2 px-3 py-2 text-small">
      {measures.map((measure) => (
        <div key={measure.label} className="flex flex-wrap justify-between gap-x-3">
          <dt className="text-ink2">{measure.label}</dt>
          <dd className="text-right">
            <b>{measureText(measure.value, measure.unit, units)}</b>
            {measure.limit !== null && (
              <span className="text-ink2">
                {' '}
                limit {measureText(measure.limit, measure.unit, units)}
              </span>
            )}
          </dd>
        </div>
      ))}
    </dl>
  );
}
