import { memo, useId } from 'react';
import type { Stage } from '#shared/api/batch.ts';
import type { VesselShape } from '#shared/api/vessel.ts';
import { lampColour, vesselStops } from './beerPaint.ts';
import { beerTop, cakeTop, FITTINGS, OUTLINES, outlineWidth } from './silhouettes.ts';

export interface VesselProps {
  shape: VesselShape;
  /** Null: the colour is unknown and the vessel stays clear. */
  srm: number | null;
  /** Volume ÷ capacity. */
  fill: number;
  /** Cake ÷ capacity; null draws none. */
  cake: number | null;
  stage: Stage;
  /** The first days, while it throws up foam. */
  foam?: boolean;
  hops?: boolean;
  width?: number;
  /** Said by a screen reader; absent where the words stand beside it. */
  label?: string;
}

function Beer({ srm, top, paint }: { srm: number | null; top: number; paint: string }) {
  const surface = `M0 ${top} q10.5 -2.6 21 0 t21 0 t21 0 t21 0 V132 H0Z`;
  if (srm !== null) return <path d={surface} fill={`url(#${paint})`} />;
  return (
    <path d={surface} className="fill-glass stroke-edge" strokeWidth="1" strokeDasharray="3 3" />
  );
}

function Foam({ top }: { top: number }) {
  const bubbles = `M0 ${top - 6} q5 -5 10.5 -1${' t10.5 0'.repeat(7)} V${top + 3} H0Z`;
  return (
    <>
      <path d={bubbles} className="fill-foam" />
      <path d={`M0 ${top + 3} H84`} className="stroke-foam-edge" strokeWidth="1" />
    </>
  );
}

function Strata({ top, hops }: { top: number; hops: boolean }) {
  const deep = 129 - top;
  const edge = `M0 ${top} q14 -2.5 28 0 t28 0 t28 0`;
  const middle = top + deep * 0.45;
  const low = top + deep * 0.75;
  return (
    <>
      <path d={`${edge} V132 H0Z`} className="fill-cake" />
      <path d={edge} className="fill-none stroke-cake-dd" strokeWidth="1.2" opacity="0.55" />
      <path
        d={`M0 ${middle} q14 -2 28 0 t28 0 t28 0`}
        className="fill-none stroke-cake-d"
        strokeWidth="1.2"
        opacity="0.8"
      />
      <path d={`M0 ${low} q14 2 28 0 t28 0 t28 0 V132 H0Z`} className="fill-cake-d" opacity="0.5" />
      {hops &&
        Array.from({ length: 10 }, (_, i) => (
          <ellipse
            key={i}
            cx={17 + i * 5.6}
            cy={top + 2 + ((i * 37) % 7)}
            rx="2"
            ry="1.4"
            className="fill-hop"
          />
        ))}
    </>
  );
}

function Paints({ id, srm, shape }: { id: string; srm: number | null; shape: VesselShape }) {
  return (
    <defs>
      <clipPath id={`${id}c`}>
        <path d={OUTLINES[shape]} />
      </clipPath>
      {srm !== null && (
        <>
          <linearGradient id={`${id}b`}>
            {vesselStops(srm).map((stop) => (
              <stop key={stop.offset} offset={stop.offset} style={{ stopColor: stop.colour }} />
            ))}
          </linearGradient>
          <radialGradient id={`${id}l`}>
            <stop offset="0" stopColor={lampColour(srm)} stopOpacity="0.62" />
            <stop offset="0.5" stopColor={lampColour(srm)} stopOpacity="0.2" />
            <stop offset="1" stopColor={lampColour(srm)} stopOpacity="0" />
          </radialGradient>
        </>
      )}
      <linearGradient id={`${id}g`}>
        <stop offset="0" stopColor="white" stopOpacity="0.3" />
        <stop offset="0.2" stopColor="white" stopOpacity="0.05" />
        <stop offset="1" stopColor="black" stopOpacity="0.1" />
      </linearGradient>
    </defs>
  );
}

function Outline({
  shape,
  stroke,
  dashed,
}: {
  shape: VesselShape;
  stroke: number;
  dashed: boolean;
}) {
  const { block, lines } = FITTINGS[shape];
  const [x, y, width, height, rx] = block;
  return (
    <g className="stroke-vline" strokeWidth={stroke} strokeLinejoin="round" strokeLinecap="round">
      <path
        d={OUTLINES[shape]}
        className="fill-none"
        strokeLinecap="butt"
        strokeDasharray={dashed ? `${2.6 * stroke} ${1.8 * stroke}` : undefined}
      />
      <rect {...{ x, y, width, height, rx }} className={dashed ? 'fill-stone' : 'fill-paper'} />
      <path d={lines} className="fill-none" />
    </g>
  );
}

/** A batch: its brewer's own vessel, the beer's computed colour, the cake as strata at its foot. */
export const Vessel = memo(function Vessel(props: VesselProps) {
  const { shape, srm, fill, cake, stage, foam = false, hops = false, width = 78, label } = props;
  const id = useId();
  const top = beerTop(fill);
  const alternative = label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true };
  return (
    <svg
      {...alternative}
      width={width}
      height={(width * 132) / 84}
      viewBox="0 0 84 132"
      className="block shrink-0 overflow-visible"
    >
      <Paints id={id} srm={srm} shape={shape} />
      {srm !== null && (
        <ellipse
          className="lamp hidden dark:block"
          cx="42"
          cy="78"
          rx="82"
          ry="84"
          fill={`url(#${id}l)`}
        />
      )}
      <path d={OUTLINES[shape]} className="fill-glass" />
      <g clipPath={`url(#${id}c)`}>
        {fill > 0 && <Beer srm={srm} top={top} paint={`${id}b`} />}
        {foam && <Foam top={top} />}
        {cake !== null && <Strata top={cakeTop(shape, cake)} hops={hops} />}
        <rect width="84" height="132" fill={`url(#${id}g)`} />
      </g>
      <Outline shape={shape} stroke={outlineWidth(width)} dashed={stage === 'pencilled'} />
    </svg>
  );
});
