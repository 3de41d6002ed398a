import { comment, commentCreate, commentPatch, seenRequest, talk } from '#shared/api/comment.ts';
import { api } from '#shared/api/urls.ts';
import type { Asked } from '../../http/operation.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canTalk } from '../../policies.ts';
import { addComment, editComment, markSeen, removeComment } from './commands.ts';
import { readTalk } from './read.ts';

const all = pathOf(api.comments(':brewery', ':id'));
const single = pathOf(api.comment(':brewery', ':id', ':commentId'));
const seen = pathOf(api.commentsSeen(':brewery', ':id'));

const named = ({ params, version }: Asked<unknown>) => ({
  chainId: params.id,
  commentId: params.commentId,
  version,
});

const read = forMember(
  {
    name: 'readTalk',
    method: 'get',
    path: all,
    summary: 'What was said about a chain, its links and its batches',
    answer: talk,
    status: 200,
  },
  canTalk,
  async ({ db, params }, member) => ({ body: await readTalk(db, member, params.id) }),
);

const add = forMember(
  {
    name: 'addComment',
    method: 'post',
    path: all,
    summary: 'Say something about a chain, a link or a batch',
    body: commentCreate,
    answer: comment,
    status: 201,
    problems: ['already-exists', 'season-archived'],
  },
  canTalk,
  async (asked, member) => {
    const body = await addComment(asked, member, asked.params.id, asked.body);
    return { body, version: body.version };
  },
);

const edit = forMember(
  {
    name: 'editComment',
    method: 'patch',
    path: single,
    summary: 'Change one’s own comment, or put a removed one back',
    body: commentPatch,
    answer: comment,
    status: 200,
    ifMatch: true,
    problems: ['in-use', 'season-archived'],
  },
  canTalk,
  async (asked, member) => {
    const body = await editComment(asked, member, named(asked), asked.body);
    return { body, version: body.version };
  },
);

const remove = forMember(
  {
    name: 'removeComment',
    method: 'delete',
    path: single,
    summary: 'Remove a comment; that something was said stays',
    answer: comment,
    status: 200,
    ifMatch: true,
    problems: ['season-archived'],
  },
  canTalk,
  async (asked, member) => {
    const body = await removeComment(asked, member, named(asked));
    return { body, version: body.version };
  },
);

const mark = forMember(
  {
    name: 'markTalkSeen',
    method: 'post',
    path: seen,
    summary: 'Remember how far one has read',
    body: seenRequest,
    answer: null,
    status: 204,
  },
  canTalk,
  async (asked, member) => {
    await markSeen(asked, member, asked.params.id, asked.body.seq);
    return {};
  },
);

export const commentRoutes = [read, add, edit, remove, mark];
