import { usePhone } from '../../board/view/useMedia.ts';
import { gravityAxis, temperatureAxis, type Axis } from './axes.ts';
import type { Drawn } from './course.ts';
import { NARROW, WIDE, type Frame, type ToX, type ToY } from './frame.ts';
import { GravityLine, WarmthLine } from './Lines.tsx';
import { Marks } from './Marks.tsx';
import { DayTicks, GravityTicks, WarmthTicks } from './Ticks.tsx';

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
      className="fill-cake opacity-45 dark:opacity-20"
    />
  );
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
