import clsx from 'clsx';
import type { Comment } from '#shared/api/comment.ts';
import type { Verdict } from '#shared/rules/vocabulary.ts';
import { VerdictMark } from '../../components/drawn/VerdictMark.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { useBoardPanel } from '../board/view/useBoardPanel.ts';
import { saidWords } from './talkWords.ts';

const TONES: Record<Verdict, string> = {
  pour: 'text-pour',
  mind: 'text-mind',
  hold: 'text-hold',
};

/** "said of Hold: tired cake, Breakwater onto Jetty Pale": the verdict as it then was; opens the link. */
export function SaidOf({ comment: { about, said } }: { comment: Comment }) {
  const { index } = useBoardView();
  const { open } = useBoardPanel();
  if (about.kind === 'chain') return null;
  const batch = index.batch(about.batchId);
  if (about.kind === 'batch' || said === null)
    return <p className="text-small text-ink2">about {batch?.name ?? 'a batch that is gone'}</p>;
  const words = (
    <>
      <VerdictMark verdict={said.verdict} size={14} />
      {saidWords(said)}
    </>
  );
  const look = clsx('inline-flex items-center gap-1 font-bold', TONES[said.verdict]);
  return (
    <p className="flex flex-wrap items-center gap-x-1.5 text-small text-ink2">
      said of
      {batch ? (
        <button
          type="button"
          onClick={() => open({ kind: 'link', laterId: batch.id })}
          className={clsx(look, 'underline-offset-4 hover:underline max-tablet:min-h-11')}
        >
          {words}
        </button>
      ) : (
        <span className={look}>{words}</span>
      )}
      {batch && <span>under {batch.name}</span>}
    </p>
  );
}
