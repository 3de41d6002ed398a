import { memo } from 'react';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { sideEdge } from './bandPath.ts';

interface CakeRunProps {
  height: number;
  verdict: Verdict;
  hops?: boolean;
}

/** Where a torn run breaks off and goes on, px below the vessel's foot. */
const TORN = [34, 58] as const;

function Stretch({ from, to }: { from: number; to: number }) {
  const height = to - from;
  const edge = sideEdge(height);
  return (
    <g transform={`translate(0 ${from})`}>
      <path d={`${edge}H2V0Z`} className="fill-cake" />
      <path d={`M7.5 0V${height}`} className="stroke-cake-d" strokeWidth="1.3" opacity="0.7" />
      <path d={edge} className="fill-none stroke-cake-dd" strokeWidth="1.6" />
      <path d={`M2 0V${height}`} className="stroke-cake-dd" strokeWidth="1.6" />
    </g>
  );
}

/** The cake running down the page on a phone. */
export const CakeRun = memo(function CakeRun({ height, verdict, hops = false }: CakeRunProps) {
  const gap = verdict === 'hold' ? TORN : null;
  return (
    <svg
      aria-hidden
      width="22"
      height={height}
      viewBox={`0 0 22 ${height}`}
      className="block overflow-visible"
      data-band={verdict}
    >
      {gap ? (
        <>
          <Stretch from={0} to={gap[0]} />
          <Stretch from={gap[1]} to={height} />
        </>
      ) : (
        <Stretch from={0} to={height} />
      )}
      {verdict === 'mind' &&
        Array.from({ length: Math.max(0, Math.floor((height - 6) / 9)) }, (_, i) => (
          <ellipse
            key={i}
            cx={8 + ((i * 5) % 8)}
            cy={6 + i * 9}
            rx="1.4"
            ry="1.8"
            className={hops ? 'fill-hop' : 'fill-on-cake'}
          />
        ))}
    </svg>
  );
});
