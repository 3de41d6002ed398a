import { z } from 'zod';
import { chain } from '#shared/api/chain.ts';
import {
  copyRequest,
  sharedChain,
  shareLink,
  shareLinkMade,
  shareLinkPatch,
  shareLinkRequest,
} from '#shared/api/share.ts';
import { api } from '#shared/api/urls.ts';
import { personOf } from '../../auth/sessions.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forAnyone, forMember } from '../../http/route.ts';
import { canEditChains, canSeeSharing, canShare } from '../../policies.ts';
import { notFound } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import { loadBoardRows } from '../board/load.ts';
import { copyChain } from './copy.ts';
import { findShareLink } from './find.ts';
import { editShareLink, listShareLinks, makeShareLink, withdrawShareLink } from './links.ts';
import { presentShared } from './present.ts';
import { countVisit } from './visit.ts';

const ofChain = pathOf(api.shareLinks(':brewery', ':id'));
const single = pathOf(api.shareLink(':brewery', ':id'));

const list = forMember(
  {
    name: 'listShareLinks',
    method: 'get',
    path: ofChain,
    summary: 'Links to one chain, with how often they were used',
    answer: z.array(shareLink),
    status: 200,
  },
  canSeeSharing,
  async ({ db, params }, member) => ({ body: await listShareLinks(db, member, params.id ?? '') }),
);

const make = forMember(
  {
    name: 'makeShareLink',
    method: 'post',
    path: ofChain,
    summary: 'Make a read-only link to one chain; its token is in this answer and nowhere else',
    body: shareLinkRequest,
    answer: shareLinkMade,
    status: 201,
    problems: ['already-exists'],
  },
  canShare,
  async (asked, member) => {
    const made = await makeShareLink(asked, member, asked.params.id ?? '', asked.body);
    return { body: made, version: made.version };
  },
);

const edit = forMember(
  {
    name: 'editShareLink',
    method: 'patch',
    path: single,
    summary: 'Change the name or the end of a link, or whether it shows prices',
    body: shareLinkPatch,
    answer: shareLink,
    status: 200,
    ifMatch: true,
    problems: ['in-use'],
  },
  canShare,
  async (asked, member) => {
    const { id = '' } = asked.params;
    const edited = await editShareLink(asked, member, id, asked.version, asked.body);
    return { body: edited, version: edited.version };
  },
);

const withdraw = forMember(
  {
    name: 'withdrawShareLink',
    method: 'delete',
    path: single,
    summary: 'Withdraw a link; whoever has it is told that it is no longer good',
    answer: null,
    status: 204,
  },
  canShare,
  async (asked, member) => {
    await withdrawShareLink(asked, member, asked.params.id ?? '');
    return {};
  },
);

const look = forAnyone(
  {
    name: 'readSharedChain',
    method: 'get',
    path: pathOf(api.shared(':token')),
    summary: 'The one chain that a link shows',
    answer: sharedChain,
    status: 200,
    problems: ['not-found', 'link-used', 'too-many'],
  },
  async ({ db, clock, req, params, tries }) => {
    await tries.count('sharedByAddress', req.ip ?? '');
    const now = clock.now();
    const found = await findShareLink(db, params.token ?? '', now);
    const rows = await loadBoardRows(db, found.brewery.id, found.seasonId);
    if (!rows) throw notFound();
    const today = dayIn(found.brewery.timeZone, now);
    const body = presentShared({ ...rows, today }, found);
    if (req.method === 'GET') await countVisit(db, found.link, await personOf(db, now, req), now);
    return { body };
  },
);

const copy = forMember(
  {
    name: 'copySharedChain',
    method: 'post',
    path: pathOf(api.copies(':brewery')),
    summary: 'Copy the chain behind a link into this brewery, its batches pencilled',
    body: copyRequest,
    answer: chain,
    status: 201,
    problems: ['link-used', 'already-exists', 'season-archived'],
  },
  canEditChains,
  async (asked, member) => {
    const made = await copyChain(asked, member, asked.body);
    return { body: made, version: made.version };
  },
);

export const shareRoutes = [list, make, edit, withdraw, look, copy];
