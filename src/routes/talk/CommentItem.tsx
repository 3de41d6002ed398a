import { useState } from 'react';
import type { Comment } from '#shared/api/comment.ts';
import { useCommentPatch, useCommentRemove } from '../../api/comments.ts';
import { sentenceOf } from '../../api/errors.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { sayUndoable } from '../../components/ui/Toast.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { SaidOf } from './SaidOf.tsx';
import { TalkForm } from './TalkForm.tsx';
import { whenSaid } from './talkWords.ts';

interface CommentItemProps {
  chainId: string;
  comment: Comment;
  isNew: boolean;
  /** Where all comments speak of one thing, it is not said again. */
  showsAbout: boolean;
}

/** Who said what, when, and of which verdict. */
export function CommentItem({ chainId, comment, isNew, showsAbout }: CommentItemProps) {
  const { board } = useBoardView();
  const [isEdited, setEdited] = useState(false);
  const place = board.members.findIndex(({ personId }) => personId === comment.by.personId);
  return (
    <li className="flex gap-2.5 border-b border-line2 py-2.5" data-comment={comment.id}>
      <span aria-hidden>
        <Avatar
          initials={comment.by.initials}
          name={comment.by.name}
          place={Math.max(0, place)}
          size={30}
        />
      </span>
      <div className="min-w-0 flex-1">
        <p className="flex flex-wrap items-baseline gap-x-2 leading-snug">
          <b>{comment.by.name}</b>
          <time dateTime={comment.at} className="text-small text-ink2">
            {whenSaid(comment.at, board.today)}
          </time>
          {comment.editedAt !== null && <span className="text-small text-ink2">edited</span>}
          {isNew && <span className="text-label font-bold text-bottle">new</span>}
        </p>
        {showsAbout && <SaidOf comment={comment} />}
        {isEdited ? (
          <EditComment chainId={chainId} comment={comment} onDone={() => setEdited(false)} />
        ) : comment.text === null ? (
          <p className="text-ink2 italic">removed</p>
        ) : (
          <p className="leading-snug wrap-anywhere whitespace-pre-line">{comment.text}</p>
        )}
        {!isEdited && !board.season.isArchived && (
          <Actions chainId={chainId} comment={comment} onEdit={() => setEdited(true)} />
        )}
      </div>
    </li>
  );
}

function EditComment({
  chainId,
  comment,
  onDone,
}: {
  chainId: string;
  comment: Comment;
  onDone: () => void;
}) {
  const { slug } = useBoardView();
  const { mutateAsync, isPending, error } = useCommentPatch(slug, chainId);
  const { id, version } = comment;
  return (
    <TalkForm
      label="What you said"
      action="Save"
      first={comment.text ?? ''}
      busy={isPending}
      error={error}
      onSend={async (text) => {
        await mutateAsync({ id, version, patch: { text } });
        onDone();
      }}
      onCancel={onDone}
    />
  );
}

const ACTION =
  'rounded-md py-0.5 text-small font-medium underline underline-offset-4 hover:text-bottle disabled:no-underline max-tablet:min-h-11';

function Actions({
  chainId,
  comment,
  onEdit,
}: {
  chainId: string;
  comment: Comment;
  onEdit: () => void;
}) {
  const { board, slug, online } = useBoardView();
  const remove = useCommentRemove(slug, chainId);
  const patch = useCommentPatch(slug, chainId);
  const isOwn = comment.by.personId === board.me.personId;
  const error = remove.error ?? patch.error;
  if (comment.text === null || (!isOwn && board.me.role !== 'head-brewer')) return null;
  const takeAway = () =>
    remove.mutate(comment, {
      onSuccess: (gone) =>
        void sayUndoable('The comment is removed.', () =>
          patch.mutate({ id: gone.id, version: gone.version, patch: { removed: false } }),
        ),
    });
  return (
    <>
      <p className="mt-0.5 flex gap-3 text-ink2 print:hidden">
        {isOwn && (
          <button type="button" disabled={!online} onClick={onEdit} className={ACTION}>
            Change
          </button>
        )}
        <button
          type="button"
          disabled={!online || remove.isPending}
          onClick={takeAway}
          className={ACTION}
        >
          Remove
        </button>
      </p>
      {error && (
        <Notice kind="hold" alert className="mt-1">
          {sentenceOf(error)}
        </Notice>
      )}
    </>
  );
}
