import type { ReactNode } from 'react';
import type { VesselShape } from '#shared/api/vessel.ts';
import { OUTLINES } from './silhouettes.ts';

interface SilhouetteProps {
  shape: VesselShape;
  width: number;
  /** Classes for fill and stroke. */
  className?: string;
  strokeWidth?: number;
  /** Drawn inside, in the box of 84 × 132. */
  children?: ReactNode;
}

/** The dashed outline of a vessel that is not there yet: an open gap, the empty board. */
export function Silhouette({
  shape,
  width,
  className,
  strokeWidth = 2,
  children,
}: SilhouetteProps) {
  return (
    <svg
      aria-hidden
      width={width}
      height={(width * 132) / 84}
      viewBox="0 0 84 132"
      className="block shrink-0 overflow-visible"
    >
      <path
        d={OUTLINES[shape]}
        className={className ?? 'fill-stone stroke-edge'}
        strokeWidth={strokeWidth}
        strokeDasharray="6 4"
      />
      {children}
    </svg>
  );
}
