import { format, formatBare } from '#shared/units/quantity.ts';
import { useUnits } from '../../../app/useUnits.ts';
import type { Point } from './course.ts';
import type { ToX, ToY } from './frame.ts';
import { thinned } from './thin.ts';

const lineOf = (points: readonly Point[], x: ToX, y: ToY): string =>
  points.map(({ day, value }) => `${x(day).toFixed(1)},${y(value).toFixed(1)}`).join(' ');

/** More dots than this would run into one another. */
const MOST_DOTS = 60;

export function GravityLine({ points, x, y }: { points: readonly Point[]; x: ToX; y: ToY }) {
  const last = points.at(-1);
  return (
    <g>
      <polyline
        points={lineOf(thinned(points), x, y)}
        className="fill-none stroke-ink"
        strokeWidth="2.6"
        strokeLinejoin="round"
      />
      {points.length <= MOST_DOTS &&
        points.map(({ day, value }, at) => (
          <circle
            key={at}
            cx={x(day)}
            cy={y(value)}
            r="4.6"
            className="fill-white stroke-ink"
            strokeWidth="2.4"
          />
        ))}
      {last && <GravityLabel last={last} x={x} y={y} />}
    </g>
  );
}

function GravityLabel({ last, x, y }: { last: Point; x: ToX; y: ToY }) {
  const units = useUnits();
  return (
    <text
      x={x(last.day) - 4}
      y={y(last.value) - 11}
      textAnchor="end"
      className="fill-ink text-[15px] font-bold"
    >
      {formatBare('gravity', last.value, units)}
    </text>
  );
}

export function WarmthLine({ points, x, y }: { points: readonly Point[]; x: ToX; y: ToY }) {
  const units = useUnits();
  const last = points.at(-1);
  const line = lineOf(thinned(points), x, y);
  const isDense = points.length > MOST_DOTS;
  return (
    <g className="fill-none stroke-mind">
      <polyline points={line} strokeWidth="1.3" />
      {!isDense && (
        <polyline points={line} strokeWidth="2.2" strokeDasharray="1 4.5" strokeLinecap="round" />
      )}
      {last && (
        <text
          x={x(last.day) - 4}
          y={y(last.value) - 9}
          textAnchor="end"
          className="fill-mind stroke-none text-[15px] font-bold"
        >
          {format('temperature', last.value, units)}
        </text>
      )}
    </g>
  );
}
