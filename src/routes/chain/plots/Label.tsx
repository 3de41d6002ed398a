import type { ReactNode } from 'react';

interface LabelProps {
  x: number;
  y: number;
  quiet?: boolean;
  end?: boolean;
  className?: string;
  children: ReactNode;
}

/** A figure beside its point, read over lines that pass behind it. */
export function Label({ x, y, quiet = false, end = false, className, children }: LabelProps) {
  return (
    <text
      x={x}
      y={y}
      textAnchor={end ? 'end' : 'start'}
      fontSize={quiet ? 13.5 : 14.5}
      fontWeight={quiet ? 400 : 700}
      paintOrder="stroke"
      strokeWidth="4"
      strokeLinejoin="round"
      className={`stroke-stone ${className ?? (quiet ? 'fill-ink2' : 'fill-ink')}`}
    >
      {children}
    </text>
  );
}
