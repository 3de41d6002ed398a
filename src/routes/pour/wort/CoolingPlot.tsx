import { useId } from 'react';
import type { PourAnswer } from '#shared/pour/check.ts';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '#shared/units/temperature.ts';
import { format } from '#shared/units/quantity.ts';
import { timeOf } from '../../../app/zonedTime.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';
import { PLOT, plotOf, roundMarks, type Plot } from './plot.ts';

/** Readings, the window as a band, the forecast and the time it comes in, kept current with the clock. */
export function CoolingPlot() {
  const { run, standing, now } = usePourView();
  const { board, units } = useBoardView();
  const clip = useId();
  const readings = run.readings
    .filter(({ withdrawn }) => !withdrawn)
    .map(({ at, c }) => ({ at: Date.parse(at), c }));
  if (readings.length === 0) return null;
  const isF = units.temperature === 'f';
  const marks = (low: number, high: number) =>
    isF
      ? roundMarks(fahrenheitFromCelsius(low), fahrenheitFromCelsius(high)).map(
          celsiusFromFahrenheit,
        )
      : roundMarks(low, high);
  const { wort } = standing;
  const plot = plotOf(readings, wort, now, marks);
  const points = readings.map(({ at, c }) => `${plot.x(at)},${plot.y(c)}`).join(' ');
  const ahead = plot.ahead.map(([at, c]) => `${plot.x(at)},${plot.y(c)}`).join(' ');
  return (
    <svg
      role="img"
      aria-label={plotLabel(readings.length, format('temperature', readings.at(-1)?.c ?? 0, units))}
      viewBox={`0 0 ${PLOT.width} ${PLOT.height}`}
      className="mt-4 block w-full max-w-xl font-sans text-[13px]"
    >
      <clipPath id={clip}>
        <rect
          x={PLOT.left}
          y={PLOT.top - 6}
          width={PLOT.right - PLOT.left}
          height={PLOT.floor - PLOT.top + 6}
        />
      </clipPath>
      <PourBand plot={plot} wort={wort} />
      {plot.marks.map((c) => (
        <text key={c} x={PLOT.left - 6} y={plot.y(c) + 4} textAnchor="end" className="fill-ink2">
          {Math.round(isF ? fahrenheitFromCelsius(c) : c)}
        </text>
      ))}
      <path d={`M${PLOT.left} ${PLOT.floor}H${PLOT.right}`} className="stroke-edge" />
      <g clipPath={`url(#${clip})`}>
        <ReadyMark plot={plot} ready={wort.ready} />
        <polyline
          points={ahead}
          className="fill-none stroke-ink"
          strokeWidth="2"
          strokeDasharray="2 5"
          strokeLinecap="round"
        />
        <polyline points={points} className="fill-none stroke-ink" strokeWidth="2.5" />
      </g>
      {readings.map(({ at, c }) => (
        <circle
          key={at}
          cx={plot.x(at)}
          cy={plot.y(c)}
          r="4.5"
          className="fill-white stroke-ink"
          strokeWidth="2.5"
        />
      ))}
      <Times
        plot={plot}
        readings={readings}
        ready={wort.ready}
        now={now}
        zone={board.brewery.timeZone}
      />
    </svg>
  );
}

const plotLabel = (count: number, last: string) =>
  `${count === 1 ? 'One reading' : `${count} readings`} against time, the last ${last}`;

/** Room that the words take at the left; the ready line goes through them where it comes early. */
const WORDS = 96;

function PourBand({ plot, wort }: { plot: Plot; wort: PourAnswer }) {
  const [top, foot] = [plot.y(wort.window.maxC), plot.y(wort.window.minC)];
  const isEarly = wort.ready !== null && plot.x(wort.ready.at) < PLOT.left + WORDS;
  const width = PLOT.right - PLOT.left;
  return (
    <>
      <rect x={PLOT.left} y={top} width={width} height={foot - top} className="fill-pour-l" />
      <path
        d={`M${PLOT.left} ${top}h${width}M${PLOT.left} ${foot}h${width}`}
        className="stroke-pour"
        strokeWidth="1.5"
      />
      <text
        x={isEarly ? PLOT.right - 6 : PLOT.left + 6}
        y={(top + foot) / 2 + 5}
        textAnchor={isEarly ? 'end' : 'start'}
        className="fill-pour font-bold"
      >
        pour window
      </text>
    </>
  );
}

interface ReadyMarkProps {
  plot: Plot;
  ready: { at: number; earliest: number; latest: number } | null;
}

/** The time it comes in as a line, its interval as a shade behind. */
function ReadyMark({ plot, ready }: ReadyMarkProps) {
  if (!ready) return null;
  const [early, late] = [plot.x(ready.earliest), plot.x(ready.latest)];
  return (
    <>
      <rect
        x={early}
        y={PLOT.top}
        width={Math.max(0, late - early)}
        height={PLOT.floor - PLOT.top}
        className="fill-ink"
        opacity="0.08"
      />
      <path
        d={`M${plot.x(ready.at)} ${PLOT.top}V${PLOT.floor}`}
        className="stroke-ink"
        strokeWidth="1.5"
      />
    </>
  );
}

interface TimesProps extends ReadyMarkProps {
  readings: readonly { at: number }[];
  now: number;
  zone: string;
}

/** Room that a time takes. */
const WORD = 44;

/** Times under the plot: ready first, then the first and the last reading where there is room. */
function Times({ plot, readings, ready, now, zone }: TimesProps) {
  const wanted = [
    ...(ready && ready.at <= plot.to ? [{ at: ready.at, bold: true }] : []),
    { at: readings[0]?.at ?? now, bold: false },
    { at: readings.at(-1)?.at ?? now, bold: false },
    { at: now, bold: false },
  ];
  const placed: { at: number; bold: boolean; x: number }[] = [];
  for (const one of wanted) {
    const x = Math.min(PLOT.right - 14, Math.max(PLOT.left + 8, plot.x(one.at)));
    if (placed.every((other) => Math.abs(other.x - x) > WORD)) placed.push({ ...one, x });
  }
  return placed.map(({ at, bold, x }) => (
    <text
      key={`${at}`}
      x={x}
      y={PLOT.floor + 20}
      textAnchor="middle"
      className={bold ? 'fill-ink font-bold' : 'fill-ink2'}
    >
      {timeOf(at, zone)}
    </text>
  ));
}
