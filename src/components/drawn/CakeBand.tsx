import { memo, useId } from 'react';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { topEdge, tornClip } from './bandPath.ts';

interface CakeBandProps {
  width: number;
  verdict: Verdict;
  /** What the flecks of a Mind are: hops are green, all else the colour of trub. */
  hops?: boolean;
}

function Flecks({ width, hops }: { width: number; hops: boolean }) {
  return Array.from({ length: Math.floor(width / 9) }, (_, i) => (
    <ellipse
      key={i}
      cx={6 + i * 9}
      cy={5.5 + ((i * 5) % 4)}
      rx="1.8"
      ry="1.2"
      className={hops ? 'fill-hop' : 'fill-on-cake'}
    />
  ));
}

/** The cake on its way to the next vessel: whole, flecked or torn, as the verdict is. */
export const CakeBand = memo(function CakeBand({ width, verdict, hops = false }: CakeBandProps) {
  const id = useId();
  const edge = topEdge(width);
  const torn = verdict === 'hold';
  return (
    <svg
      aria-hidden
      width={width}
      height="13"
      viewBox={`0 0 ${width} 13`}
      className="block overflow-visible"
      data-band={verdict}
    >
      {torn && (
        <clipPath id={id}>
          <path d={tornClip(width)} />
        </clipPath>
      )}
      <g clipPath={torn ? `url(#${id})` : undefined}>
        <path d={`${edge}V13H0Z`} className="fill-cake" />
        <path d={`M0 9.5H${width}`} className="stroke-cake-d" strokeWidth="1.2" opacity="0.7" />
        <path d={edge} className="fill-none stroke-cake-dd" strokeWidth="1.5" />
      </g>
      {verdict === 'mind' && <Flecks width={width} hops={hops} />}
    </svg>
  );
});
