import clsx from 'clsx';
import { flatBeer } from './beerPaint.ts';

interface SwatchProps {
  /** Null: unknown, drawn hollow. */
  srm: number | null;
  size?: 'small' | 'glass' | 'large';
}

const SIZES = {
  small: 'size-[13px] rounded-[3px]',
  glass: 'h-[34px] w-[17px] rounded-t-[3px] rounded-b-[5px]',
  large: 'h-11 w-16 rounded-[6px]',
};

/** A beer's flat colour, always with an outline: a pale beer would be lost on a pale ground. */
export function Swatch({ srm, size = 'small' }: SwatchProps) {
  return (
    <i
      aria-hidden
      className={clsx(
        'inline-block shrink-0 border',
        SIZES[size],
        size === 'small' ? 'border-ink/35' : 'border-[1.5px] border-vline',
        srm === null && 'border-dashed bg-glass',
      )}
      style={srm === null ? undefined : { backgroundColor: flatBeer(srm) }}
    />
  );
}
