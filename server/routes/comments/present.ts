import type { Comment, CommentAbout } from '#shared/api/comment.ts';
import { initialsOf } from '../people/present.ts';
import type { CommentRow } from './find.ts';

/** Whoever closed the account is not named any more. */
const FORMER = 'A former brewer';

export function presentComment({ row, name, closedAt }: CommentRow): Comment {
  const known = closedAt === null ? name : FORMER;
  const isRemoved = row.deletedAt !== null;
  return {
    id: row.id,
    version: row.version,
    seq: row.seq,
    about: presentAbout(row),
    said: row.verdict,
    by: { personId: row.personId, name: known, initials: initialsOf(known) },
    text: isRemoved ? null : row.text,
    at: row.createdAt.toISOString(),
    editedAt: isRemoved ? null : (row.editedAt?.toISOString() ?? null),
  };
}

function presentAbout({ about, batchId }: CommentRow['row']): CommentAbout {
  return about === 'chain' || batchId === null ? { kind: 'chain' } : { kind: about, batchId };
}
