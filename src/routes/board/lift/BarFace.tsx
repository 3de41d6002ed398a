import clsx from 'clsx';
import { memo } from 'react';
import type { Gap } from '#shared/chain/gaps.ts';
import { VerdictMark } from '../../../components/drawn/VerdictMark.tsx';
import { WORD_TONE } from './gapTones.ts';
import { gapDay, gapWord } from './words.ts';

/** An open place as one line: on a phone, and along the bench. */
export const BarFace = memo(function BarFace({ gap, isOver }: { gap: Gap; isOver: boolean }) {
  const isBench = gap.key === 'bench';
  return (
    <div
      className={clsx(
        'gap-open absolute inset-0.5 flex items-center justify-center gap-2.5 overflow-hidden rounded-xl border-2 border-dashed px-3 text-small',
        gap.best || isOver ? 'border-bottle' : 'border-edge',
        isBench && !isOver ? 'bg-bench/85' : gap.best ? 'bg-pour-l' : 'bg-paper',
        isOver && 'outline-3 outline-bottle',
      )}
    >
      <b className={clsx('flex shrink-0 items-center gap-1.5', WORD_TONE[gap.verdict])}>
        <VerdictMark verdict={gap.verdict} size={18} />
        {isBench ? 'Put on the bench' : gapWord(gap)}
      </b>
      <span className="min-w-0 truncate text-ink2">
        {gap.best && <b className="text-bottle">Best gap · </b>}
        {[isBench ? null : gapDay(gap), ...gap.reasons.slice(0, 1)].filter(Boolean).join(' · ')}
      </span>
    </div>
  );
});
