import type { CourseStep } from '#shared/chain/course.ts';
import { VerdictPill } from '../../../components/drawn/VerdictPill.tsx';
import { verdictWord } from '../../../components/drawn/verdictWords.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { useBoardPanel } from '../../board/view/useBoardPanel.ts';
import { countedFindings, shortReason } from '../../board/view/words.ts';

/** What a link says, with its reason; opens the link. */
export function StepPill({ step: { laterId, earlierId, link } }: { step: CourseStep }) {
  const { index } = useBoardView();
  const { panel, open } = useBoardPanel();
  const reason = shortReason(link, '');
  const word = verdictWord(link.verdict, countedFindings(link));
  const isOpen = panel?.kind === 'link' && panel.laterId === laterId;
  return (
    <button
      type="button"
      aria-expanded={isOpen}
      title={reason || undefined}
      onClick={() => open({ kind: 'link', laterId })}
      className="flex max-w-[142px] flex-col items-start rounded-lg text-left text-[0.8125rem] leading-tight text-ink2 aria-expanded:outline-3 aria-expanded:outline-offset-2 aria-expanded:outline-bottle max-tablet:min-h-11"
    >
      <span className="sr-only">
        {index.batch(laterId)?.name} onto {index.batch(earlierId)?.name}:
      </span>
      <VerdictPill verdict={link.verdict} word={word} />
      <span className="mt-0.5 max-w-full truncate pl-1">
        {[reason, link.accepted ? 'accepted' : ''].filter(Boolean).join(', ')}
      </span>
    </button>
  );
}
