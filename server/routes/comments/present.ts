import type { Comment, CommentAbout } from '#shared/api/comment.ts';
import { initialsOf } from '../people/present.ts';
import type { CommentRow } from './find.ts';

export function presentComment({ row, name }: CommentRow): Comment {
  const isRemoved = row.deletedAt !== null;
  return {
    id: row.id,
    version: row.version,
    seq: row.seq,
    about: presentAbout(row),
    said: row.verdict,
    by: { personId: row.personId, name, initials: initialsOf(name) },
    text: isRemoved ? null : row.text,
    at: row.createdAt.toISOString(),
    editedAt: isRemoved ? null : (row.editedAt?.toISOString() ?? null),
  };
}

function presentAbout({ about, batchId }: CommentRow['row']): CommentAbout {
  return about === 'chain' || batchId === null ? { kind: 'chain' } : { kind: about, batchId };
}
