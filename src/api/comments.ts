import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { Board } from '#shared/api/board.ts';
import {
  comment,
  talk,
  type Comment,
  type CommentCreate,
  type CommentPatch,
  type Talk,
} from '#shared/api/comment.ts';
import { api } from '#shared/api/urls.ts';
import { boardQuery } from './board.ts';
import { request, requestNothing } from './client.ts';
import { useReadAnew } from './useReadAnew.ts';

/** The talk of a chain. The only owner of its key. */
export const talkQuery = (slug: string, chainId: string) =>
  queryOptions({
    queryKey: ['talk', slug, chainId] as const,
    queryFn: ({ signal }) => request(talk, 'GET', api.comments(slug, chainId), { signal }),
  });

/** The talk; what is said raises the board's revision too. */
export function useTalk(slug: string, chainId: string, revision: number) {
  const query = talkQuery(slug, chainId);
  useReadAnew(query.queryKey, revision);
  return useQuery(query);
}

/** After a change the answer stands in the talk at once. */
function useTalkChanged(slug: string, chainId: string) {
  const client = useQueryClient();
  const { queryKey } = talkQuery(slug, chainId);
  return {
    onSuccess: (said: Comment) =>
      client.setQueryData<Talk>(queryKey, (before) => before && withComment(before, said)),
    onSettled: () => client.invalidateQueries({ queryKey }),
  };
}

function withComment(before: Talk, said: Comment): Talk {
  const others = before.comments.filter(({ id }) => id !== said.id);
  return { ...before, comments: [...others, said].toSorted((a, b) => a.seq - b.seq) };
}

export function useSay(slug: string, chainId: string) {
  return useMutation({
    mutationFn: (body: CommentCreate) =>
      request(comment, 'POST', api.comments(slug, chainId), { body }),
    ...useTalkChanged(slug, chainId),
  });
}

type Which = Pick<Comment, 'id' | 'version'>;

export function useCommentPatch(slug: string, chainId: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: Which & { patch: CommentPatch }) =>
      request(comment, 'PATCH', api.comment(slug, chainId, id), { body: patch, ifMatch: version }),
    ...useTalkChanged(slug, chainId),
  });
}

export function useCommentRemove(slug: string, chainId: string) {
  return useMutation({
    mutationFn: ({ id, version }: Which) =>
      request(comment, 'DELETE', api.comment(slug, chainId, id), { ifMatch: version }),
    ...useTalkChanged(slug, chainId),
  });
}

/** Tells how far one has read; the mark on the board goes with it. */
export function useMarkSeen(slug: string, chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (seq: number) =>
      requestNothing('POST', api.commentsSeen(slug, chainId), { body: { seq } }),
    onSuccess: () =>
      client.setQueryData<Board>(boardQuery(slug).queryKey, (board) => {
        if (!board) return board;
        const { [chainId]: _, ...unread } = board.unread;
        return { ...board, unread };
      }),
  });
}
