import { useEffect, useState } from 'react';
import type { Comment, CommentAbout, Talk as TalkAnswer } from '#shared/api/comment.ts';
import { useMarkSeen, useSay, useTalk } from '../../api/comments.ts';
import { sentenceOf } from '../../api/errors.ts';
import { newId } from '../../app/newId.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { CommentItem } from './CommentItem.tsx';
import { TalkForm } from './TalkForm.tsx';
import { sameAbout } from './talkWords.ts';

interface TalkProps {
  chainId: string;
  /** Absent: all that was said on the chain. */
  about?: CommentAbout;
}

/** The talk of a chain, or of one thing on it. */
export function Talk({ chainId, about }: TalkProps) {
  const { board, slug } = useBoardView();
  const { data, error } = useTalk(slug, chainId, board.season.revision);
  if (error && !data) return <Notice kind="hold">{sentenceOf(error)}</Notice>;
  if (!data) return <Skeleton label="Loading the talk" />;
  const shown = about
    ? data.comments.filter((comment) => sameAbout(comment.about, about))
    : data.comments;
  return (
    <>
      {about ? (
        <Comments chainId={chainId} comments={shown} seen={data.seen} showsAbout={false} />
      ) : (
        <WholeTalk chainId={chainId} talk={data} />
      )}
      {board.season.isArchived ? (
        <p className="text-ink2">The season is archived, so nothing more is said here.</p>
      ) : (
        <Say chainId={chainId} about={about ?? { kind: 'chain' }} />
      )}
    </>
  );
}

/** Whoever has the whole talk before them has seen it; what was new then stays marked. */
function WholeTalk({ chainId, talk }: { chainId: string; talk: TalkAnswer }) {
  const { slug, online } = useBoardView();
  const [seenBefore] = useState(talk.seen);
  const { mutate } = useMarkSeen(slug, chainId);
  const last = talk.comments.at(-1)?.seq ?? 0;
  const isBehind = online && talk.unread > 0 && last > talk.seen;
  useEffect(() => {
    if (isBehind) mutate(last);
  }, [isBehind, last, mutate]);
  return <Comments chainId={chainId} comments={talk.comments} seen={seenBefore} showsAbout />;
}

interface CommentsProps {
  chainId: string;
  comments: readonly Comment[];
  seen: number;
  showsAbout: boolean;
}

function Comments({ chainId, comments, seen, showsAbout }: CommentsProps) {
  const { board } = useBoardView();
  if (comments.length === 0)
    return <p className="mt-1 mb-3 text-ink2">Nobody said anything yet.</p>;
  return (
    <ol aria-label="Talk" className="mt-1 mb-3">
      {comments.map((comment) => (
        <CommentItem
          key={comment.id}
          chainId={chainId}
          comment={comment}
          isNew={comment.seq > seen && comment.by.personId !== board.me.personId}
          showsAbout={showsAbout}
        />
      ))}
    </ol>
  );
}

const LABELS: Record<CommentAbout['kind'], string> = {
  chain: 'Write to the chain',
  link: 'Say something about this link',
  batch: 'Say something about this batch',
};

/** What had no answer is sent again under its id, and said once; other words are another comment. */
function Say({ chainId, about }: { chainId: string; about: CommentAbout }) {
  const { slug } = useBoardView();
  const { mutateAsync, isPending, error } = useSay(slug, chainId);
  const [tried, setTried] = useState<{ id: string; text: string } | null>(null);
  return (
    <TalkForm
      label={LABELS[about.kind]}
      action="Send"
      busy={isPending}
      error={error}
      onSend={async (text) => {
        const said = tried?.text === text ? tried : { id: newId(), text };
        setTried(said);
        await mutateAsync({ ...said, about });
        setTried(null);
      }}
    />
  );
}
