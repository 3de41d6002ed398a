import clsx from 'clsx';
import { memo } from 'react';
import type { VesselShape } from '#shared/api/vessel.ts';
import type { Gap } from '#shared/chain/gaps.ts';
import { Silhouette } from '../../../components/drawn/Silhouette.tsx';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { SHELF } from '../view/drawing.ts';
import { OUTLINE_TONE, WORD_TONE } from './gapTones.ts';
import { gapDay, gapWord } from './words.ts';

interface GapFaceProps {
  gap: Gap;
  isOver: boolean;
  shape: VesselShape;
}

/** Height down to the foot of a vessel on the shelf, and of what is under it before the tag. */
const ABOVE = SHELF.top + 2;
const EDGE = 13;

/** An open place: the vessel that would stand there, the verdict in shape and word, day, reason. */
export const GapFace = memo(function GapFace({ gap, isOver, shape }: GapFaceProps) {
  const isMarked = gap.best || isOver;
  return (
    <div
      className={clsx(
        'gap-open absolute inset-x-[3px] top-1 bottom-px rounded-xl',
        gap.best ? 'bg-pour-l' : isOver ? 'bg-white' : 'bg-white/55',
        isMarked && 'outline-3 -outline-offset-3 outline-bottle',
        gap.best && isOver && 'ring-4 ring-bottle/30',
      )}
    >
      {gap.best && (
        <span className="absolute top-2 left-1/2 z-10 -translate-x-1/2 rounded-verdict bg-bottle px-3 py-[3px] text-label leading-[1.2] font-bold whitespace-nowrap text-on-bottle">
          Best gap
        </span>
      )}
      <div className="flex items-end justify-center" style={{ height: ABOVE - 4 }}>
        <span className={clsx('relative', WORD_TONE[gap.verdict])}>
          <Silhouette
            shape={shape}
            width={70}
            strokeWidth={gap.best ? 2.8 : 2}
            className={OUTLINE_TONE[gap.verdict]}
          />
          <span
            className={clsx(
              'absolute top-[52%] left-1/2 -translate-x-1/2',
              // Larger without a layout: the pointer may go from gap to gap in every frame.
              isMarked && 'scale-[1.14]',
            )}
          >
            <VerdictMark verdict={gap.verdict} size={28} />
          </span>
        </span>
      </div>
      <div
        className="flex flex-col items-center px-1 text-center text-label leading-[1.2] text-ink2"
        style={{ marginTop: EDGE }}
      >
        <span className="rounded-t-tag rounded-b-tag-foot border border-dashed border-edge bg-white px-2.5 pb-px font-bold text-ink">
          {gapDay(gap)}
        </span>
        <b className={clsx('mt-1', WORD_TONE[gap.verdict])}>{gapWord(gap)}</b>
        <span className="line-clamp-2">{gap.reasons.slice(0, 2).join(', ').toLowerCase()}</span>
      </div>
    </div>
  );
});
