import type { CoursePoint } from '#shared/chain/course.ts';
import { flatBeer } from '../../../components/drawn/beerPaint.ts';
import { middleOf } from '../columns.ts';
import { Lane, type LaneOf } from './Lane.tsx';
import { Label } from './Label.tsx';
import { labelSide, scaleOf, strokesOf, type Scale } from './scales.ts';

interface ValueLaneProps extends LaneOf {
  title: string;
  unit: string;
  valueOf: (point: CoursePoint) => number | null;
  say: (value: number) => string;
  /** The smallest difference that fills the lane. */
  least: number;
  height?: number;
  /** Points as large drops of the beer. */
  isColour?: boolean;
}

const RADIUS = { dot: 6, drop: 11 } as const;

/** One value a batch, joined where both are known: solid where it happened, dashed where it is a plan. */
export function ValueLane(props: ValueLaneProps) {
  const { title, unit, course, whole = course, valueOf, say, least } = props;
  const { height = 104, isColour = false } = props;
  const values = course.points.map(valueOf);
  const scale = scaleOf(whole.points.map(valueOf), { top: 28, bottom: height - 26, least });
  return (
    <Lane title={title} unit={unit} height={height} course={course}>
      <Strokes values={values} scale={scale} points={course.points} />
      {values.map((value, place) => {
        const point = course.points[place];
        if (value === null || !point) return null;
        const [x, y] = [middleOf(place), scale(value)];
        const side = labelSide(values, place);
        return (
          <g key={point.batchId}>
            <circle
              cx={x}
              cy={y}
              r={isColour ? RADIUS.drop : RADIUS.dot}
              className={isColour ? 'stroke-vline' : 'fill-white stroke-ink'}
              strokeWidth="2"
              strokeDasharray={point.isBrewed ? undefined : '3.4 2.4'}
              {...(isColour && { style: { fill: flatBeer(value) } })}
            />
            <Label x={x + (isColour ? 18 : 13)} y={y + (side === 'above' ? -4 : 16)}>
              {say(value)}
            </Label>
          </g>
        );
      })}
    </Lane>
  );
}

interface StrokesProps {
  values: readonly (number | null)[];
  scale: Scale;
  points: readonly CoursePoint[];
}

export function Strokes({ values, scale, points }: StrokesProps) {
  return strokesOf(values).map(({ fromPlace, toPlace }) => (
    <path
      key={fromPlace}
      d={`M${middleOf(fromPlace)} ${scale(values[fromPlace] ?? 0)}L${middleOf(toPlace)} ${scale(values[toPlace] ?? 0)}`}
      className="stroke-ink"
      strokeWidth="2.2"
      strokeDasharray={points[toPlace]?.isBrewed ? undefined : '6 4'}
    />
  ));
}
