import clsx from 'clsx';
import type { Batch } from '#shared/api/batch.ts';
import type { JudgedLink } from '#shared/chain/judgeBoard.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { uncheckedWord } from '../../../components/drawn/verdictWords.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { countedFindings, gravityStep, shortReason } from '../view/words.ts';

interface ShelfLinkProps {
  earlier: Batch;
  later: Batch;
  link: JudgedLink;
}

/** The verdict under a band with its reason; opens the link's panel. */
export function ShelfLink({ earlier, later, link }: ShelfLinkProps) {
  const { units } = useBoardView();
  const { panel, open } = useBoardPanel();
  const isOpen = panel?.kind === 'link' && panel.laterId === later.id;
  const reason = shortReason(link, gravityStep(earlier, later, units));
  const notes = [
    ...(link.accepted ? ['accepted'] : []),
    ...(link.unchecked.length > 0 ? [uncheckedWord(link.unchecked.length)] : []),
  ];
  return (
    <button
      type="button"
      aria-expanded={isOpen}
      onClick={() => open({ kind: 'link', laterId: later.id })}
      className="flex w-[141px] flex-col items-start gap-[5px] rounded-chip text-left outline-offset-0"
    >
      <span className="sr-only">
        {later.name} onto {earlier.name}:
      </span>
      <span
        className={clsx('rounded-verdict outline-offset-2', isOpen && 'outline-3 outline-bottle')}
      >
        <VerdictPill verdict={link.verdict} findings={countedFindings(link)} />
      </span>
      <span className="line-clamp-2 pl-1.5 text-label leading-[1.2] text-ink2">
        {[reason, ...notes].filter(Boolean).join(', ')}
      </span>
    </button>
  );
}
