import { ChevronRight } from 'lucide-react';
import type { Batch } from '#shared/api/batch.ts';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { uncheckedWord } from '../../../components/drawn/verdictWords.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { countedFindings, gravityStep, shortReason } from '../view/words.ts';

interface PhoneLinkProps {
  earlier: Batch;
  later: Batch;
  link: JudgedLink;
}

/** The verdict between two batches; opens the link. */
export function PhoneLink({ earlier, later, link }: PhoneLinkProps) {
  const { units } = useBoardView();
  const { open } = useBoardPanel();
  const words = [
    shortReason(link, gravityStep(earlier, later, units)),
    ...(link.accepted ? ['accepted'] : []),
    ...(link.unchecked.length > 0 ? [uncheckedWord(link.unchecked.length)] : []),
  ];
  return (
    <button
      type="button"
      onClick={() => open({ kind: 'link', laterId: later.id })}
      className="mt-1 mb-1.5 ml-[88px] flex min-h-11 w-[calc(100%-106px)] items-center gap-2.5 rounded-lg text-left text-body text-ink2"
    >
      <span className="sr-only">
        {later.name} onto {earlier.name}:
      </span>
      <VerdictPill verdict={link.verdict} findings={countedFindings(link)} large />
      <span className="line-clamp-2 min-w-0 flex-1 leading-tight">
        {words.filter(Boolean).join(', ')}
      </span>
      <ChevronRight size={18} aria-hidden className="shrink-0" />
    </button>
  );
}
