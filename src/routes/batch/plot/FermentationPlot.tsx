import { formatDayShort } from '#shared/units/day.ts';
import { formatBare, format } from '#shared/units/quantity.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { dayOf } from '../../../app/zonedTime.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePhone } from '../../board/view/useMedia.ts';
import { dayTicks, gravityAxis, temperatureAxis, type Axis } from './axes.ts';
import type { Drawn, Mark, Point } from './course.ts';
import { thinned } from './thin.ts';

interface Frame {
  width: number;
  height: number;
  left: number;
  right: number;
  top: number;
  bottom: number;
}

const WIDE: Frame = { width: 640, height: 372, left: 50, right: 588, top: 22, bottom: 334 };
const NARROW: Frame = { width: 352, height: 300, left: 44, right: 304, top: 22, bottom: 264 };
const TEXT = 'fill-ink2 text-[13.5px]';

/** Gravity and temperature against time. Its figures stand in the table of readings below. */
export function FermentationPlot({ drawn }: { drawn: Drawn }) {
  const frame = usePhone() ? NARROW : WIDE;
  const gravity = gravityAxis(drawn);
  const warmth = temperatureAxis(drawn);
  const x = (day: number) => frame.left + (day / drawn.days) * (frame.right - frame.left);
  const scale = (axis: Axis) => (value: number) =>
    frame.bottom - ((value - axis.low) / (axis.high - axis.low)) * (frame.bottom - frame.top);
  return (
    <svg
      aria-hidden
      viewBox={`0 0 ${frame.width} ${frame.height}`}
      className="block h-auto w-full overflow-visible font-sans"
    >
      {warmth && drawn.range && <Warm {...{ drawn, frame }} y={scale(warmth)} />}
      {gravity && <GravityTicks axis={gravity} y={scale(gravity)} frame={frame} />}
      {warmth && <WarmthTicks axis={warmth} y={scale(warmth)} frame={frame} />}
      <DayTicks drawn={drawn} x={x} frame={frame} />
      {gravity && <Band drawn={drawn} x={x} y={scale(gravity)} />}
      {warmth && <WarmthLine points={drawn.temperature} x={x} y={scale(warmth)} />}
      {gravity && <GravityLine points={drawn.gravity} x={x} y={scale(gravity)} />}
      <Marks marks={drawn.marks} x={x} frame={frame} />
      <path d={`M${frame.left} ${frame.bottom}H${frame.right}`} className="stroke-edge" />
    </svg>
  );
}

type ToX = (day: number) => number;
type ToY = (value: number) => number;

function Warm({ drawn, frame, y }: { drawn: Drawn; frame: Frame; y: ToY }) {
  if (!drawn.range) return null;
  const top = Math.max(frame.top, y(drawn.range.max));
  const foot = Math.min(frame.bottom, y(drawn.range.min));
  return (
    <rect
      x={frame.left}
      y={top}
      width={frame.right - frame.left}
      height={Math.max(0, foot - top)}
      className="fill-cake"
      opacity="0.45"
    />
  );
}

function GravityTicks({ axis, y, frame }: { axis: Axis; y: ToY; frame: Frame }) {
  const units = useUnits();
  return axis.ticks.map((tick) => (
    <g key={tick}>
      <path d={`M${frame.left} ${y(tick)}H${frame.right}`} className="stroke-line2" />
      <text x={frame.left - 7} y={y(tick) + 4.5} textAnchor="end" className={TEXT}>
        {formatBare('gravity', tick, units)}
      </text>
    </g>
  ));
}

function WarmthTicks({ axis, y, frame }: { axis: Axis; y: ToY; frame: Frame }) {
  const units = useUnits();
  return axis.ticks.map((tick) => (
    <text key={tick} x={frame.right + 7} y={y(tick) + 4.5} className={TEXT}>
      {format('temperature', tick, units)}
    </text>
  ));
}

function DayTicks({ drawn, x, frame }: { drawn: Drawn; x: ToX; frame: Frame }) {
  const { timeZone } = useBoardView().board.brewery;
  const first = formatDayShort(dayOf(new Date(drawn.start).toISOString(), timeZone));
  return dayTicks(drawn.days, frame === NARROW ? 4 : 8).map((day) => (
    <g key={day}>
      <path d={`M${x(day)} ${frame.bottom}v5`} className="stroke-edge" />
      <text x={x(day)} y={frame.bottom + 20} textAnchor="middle" className={TEXT}>
        {day === 0 ? first : `day ${day}`}
      </text>
    </g>
  ));
}

function Band({ drawn: { band }, x, y }: { drawn: Drawn; x: ToX; y: ToY }) {
  if (band.length === 0) return null;
  const at = (day: number, value: number) => `${x(day).toFixed(1)},${y(value).toFixed(1)}`;
  const above = band.map(({ day, high }) => at(day, high));
  const below = band.map(({ day, low }) => at(day, low)).reverse();
  return (
    <polygon
      points={[...above, ...below].join(' ')}
      className="fill-pour-l stroke-pour"
      strokeOpacity="0.6"
    />
  );
}

const lineOf = (points: readonly Point[], x: ToX, y: ToY): string =>
  points.map(({ day, value }) => `${x(day).toFixed(1)},${y(value).toFixed(1)}`).join(' ');

/** More dots than this would run into one another. */
const MOST_DOTS = 60;

function GravityLine({ points, x, y }: { points: readonly Point[]; x: ToX; y: ToY }) {
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

function WarmthLine({ points, x, y }: { points: readonly Point[]; x: ToX; y: ToY }) {
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

function Marks({ marks, x, frame }: { marks: readonly Mark[]; x: ToX; frame: Frame }) {
  return marks.map(({ day, words, kind }, at) =>
    kind === 'event' ? (
      <g key={at}>
        <path
          d={`M${x(day)} ${frame.bottom - 14}v14`}
          className="stroke-mind"
          strokeWidth="1.6"
        />
        <MarkText x={x(day)} y={frame.bottom - 5} words={words} frame={frame} />
      </g>
    ) : (
      <g key={at}>
        <path
          d={`M${x(day)} ${frame.top - 4}V${frame.bottom}`}
          className="stroke-bottle"
          strokeWidth="2"
          strokeDasharray={kind === 'today' ? '5 4' : undefined}
        />
        <MarkText x={x(day)} y={frame.top + 4} words={words} frame={frame} isStrong />
      </g>
    ),
  );
}

interface MarkTextProps {
  x: number;
  y: number;
  words: string;
  frame: Frame;
  isStrong?: boolean;
}

/** On the side where there is room. */
function MarkText({ x, y, words, frame, isStrong = false }: MarkTextProps) {
  const isLate = x > (frame.left + frame.right) / 2;
  return (
    <text
      x={isLate ? x - 7 : x + 6}
      y={y}
      textAnchor={isLate ? 'end' : 'start'}
      className={isStrong ? 'fill-bottle text-[13.5px] font-bold' : TEXT}
    >
      {words}
    </text>
  );
}
