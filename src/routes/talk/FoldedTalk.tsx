import type { CommentAbout } from '#shared/api/comment.ts';
import { useTalk } from '../../api/comments.ts';
import { useBoardView } from '../board/view/BoardView.tsx';
import { Talk } from './Talk.tsx';
import { sameAbout } from './talkWords.ts';

interface FoldedTalkProps {
  chainId: string;
  about: CommentAbout;
}

/** "Talk (2)" at the foot of a link or a batch. */
export function FoldedTalk({ chainId, about }: FoldedTalkProps) {
  const { board, slug } = useBoardView();
  const { data } = useTalk(slug, chainId, board.season.revision);
  const said =
    data?.comments.filter((each) => each.text !== null && sameAbout(each.about, about)) ?? [];
  return (
    <details className="border-t border-line py-[13px] print:hidden">
      <summary className="font-display text-[1.03125rem] font-[680] tracking-[-0.02em]">
        Talk{said.length > 0 && ` (${said.length})`}
      </summary>
      <Talk chainId={chainId} about={about} />
    </details>
  );
}
