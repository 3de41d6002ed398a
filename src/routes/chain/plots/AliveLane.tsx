import { COLUMN, middleOf, widthOf } from '../columns.ts';
import { timesText } from '../courseWords.ts';
import { Label } from './Label.tsx';
import { Lane, type LaneOf } from './Lane.tsx';
import { labelSide, ratioScaleOf } from './scales.ts';
import { Strokes } from './ValueLane.tsx';

const HEIGHT = 156;
/** For words between a point and the line of the need, px. */
const ROOM_BELOW = 32;
/** What a wort needs, as a multiple of itself. */
const NEED = 1;

/** Living cells of the cake under each wort against its need, with the 90 % interval. */
export function AliveLane({ course, whole = course }: LaneOf) {
  const { points } = course;
  const ratios = points.map(({ alive }) => alive?.ratio.likely ?? null);
  const ends = whole.points.flatMap(({ alive }) =>
    alive ? [alive.ratio.low, alive.ratio.high] : [],
  );
  const scale = ratioScaleOf([NEED, ...ends], { top: 30, bottom: HEIGHT - 20, least: 2 });
  const width = widthOf(points.length);
  const need = scale(NEED);
  return (
    <Lane title="Alive" unit="cells in the cake ÷ need" height={HEIGHT} course={course}>
      <rect y={need} width={width} height={HEIGHT - need} className="fill-hold-l" opacity="0.55" />
      <path
        d={`M0 ${need}H${width}`}
        className="stroke-hold"
        strokeWidth="1.3"
        strokeDasharray="2 4"
      />
      <Label x={width - 4} y={need + 15} quiet end className="fill-hold">
        below what the wort needs
      </Label>
      <Strokes values={ratios} scale={scale} points={points} />
      {points.map(({ batchId, alive, generation, isBrewed }, place) => {
        const x = middleOf(place);
        if (!alive)
          return (
            <Label key={batchId} x={x - COLUMN.vessel / 2} y={HEIGHT / 2 - 14} quiet>
              {place === 0 && generation === 1 ? 'fresh pack' : 'not known'}
            </Label>
          );
        const { low, likely, high } = alive.ratio;
        const hasRoom = need - scale(likely) > ROOM_BELOW;
        const isBelow = hasRoom && labelSide(ratios, place) === 'below';
        const label = scale(likely) + (isBelow ? 25 : -14);
        return (
          <g key={batchId}>
            <path
              d={`M${x} ${scale(high)}V${scale(low)}m-5 0h10M${x - 5} ${scale(high)}h10`}
              className="stroke-cake-dd"
              strokeWidth="2"
            />
            <circle
              cx={x}
              cy={scale(likely)}
              r="12"
              className="fill-cake stroke-vline"
              strokeWidth="2"
              strokeDasharray={isBrewed ? undefined : '3.4 2.4'}
            />
            <text
              x={x}
              y={scale(likely) + 5}
              textAnchor="middle"
              fontSize="14"
              fontWeight="700"
              className="fill-on-cake"
            >
              {generation}
            </text>
            <Label x={x + 14} y={label}>
              {timesText(likely)}
              <tspan className="fill-ink2" fontSize="13.5" fontWeight="400">
                {` ${timesText(low)} to ${timesText(high)}`}
              </tspan>
            </Label>
          </g>
        );
      })}
    </Lane>
  );
}
