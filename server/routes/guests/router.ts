import { z } from 'zod';
import {
  chainGuest,
  guestAccept,
  guestAccepted,
  guestMade,
  guestPreview,
  guestRequest,
} from '#shared/api/guest.ts';
import { api } from '#shared/api/urls.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forAnyone, forMember, forSignedIn } from '../../http/route.ts';
import { canSeeSharing, canShare } from '../../policies.ts';
import { acceptInvitation } from './accept.ts';
import { inviteGuest, listGuests, withdrawGuest } from './commands.ts';
import { findInvitation } from './find.ts';
import { leaveChainRoute } from './leave.ts';

const ofChain = pathOf(api.guests(':brewery', ':id'));
const invitation = pathOf(api.guestInvitation(':token'));

const list = forMember(
  {
    name: 'listGuests',
    method: 'get',
    path: ofChain,
    summary: 'People of other breweries on one chain, and open invitations to it',
    answer: z.array(chainGuest),
    status: 200,
  },
  canSeeSharing,
  async ({ db, params }, member) => ({ body: await listGuests(db, member, params.id ?? '') }),
);

const invite = forMember(
  {
    name: 'inviteGuest',
    method: 'post',
    path: ofChain,
    summary: 'Invite somebody of another brewery to one chain; the token is in this answer only',
    body: guestRequest,
    answer: guestMade,
    status: 201,
    problems: ['already-exists'],
  },
  canShare,
  async (asked, member) => ({
    body: await inviteGuest(asked, member, asked.params.id ?? '', asked.body),
  }),
);

const withdraw = forMember(
  {
    name: 'withdrawGuest',
    method: 'delete',
    path: pathOf(api.guest(':brewery', ':id')),
    summary: 'End a guest’s access to a chain, or an invitation to it',
    answer: null,
    status: 204,
  },
  canShare,
  async (asked, member) => {
    await withdrawGuest(asked, member, asked.params.id ?? '');
    return {};
  },
);

const preview = forAnyone(
  {
    name: 'readGuestInvitation',
    method: 'get',
    path: invitation,
    summary: 'What an invitation to a chain is for',
    answer: guestPreview,
    status: 200,
    problems: ['not-found', 'link-used', 'too-many'],
  },
  async ({ db, clock, req, params, tries }) => {
    await tries.count('joinByAddress', req.ip ?? '');
    const found = await findInvitation(db, params.token ?? '', clock.now());
    const { row, brewery, chain, by } = found;
    return {
      body: {
        breweryName: brewery.name,
        chainName: chain.name,
        role: row.role,
        invitedBy: by,
        expiresAt: row.expiresAt.toISOString(),
      },
    };
  },
);

const accept = forSignedIn(
  {
    name: 'acceptGuestInvitation',
    method: 'post',
    path: invitation,
    summary: 'Put the chain of an invitation on the board of one of one’s own breweries',
    body: guestAccept,
    answer: guestAccepted,
    status: 201,
    problems: ['link-used', 'already-exists', 'too-many'],
  },
  async ({ db, clock, req, body, params, tries }, { person }) => {
    await tries.count('joinByAddress', req.ip ?? '');
    const { token = '' } = params;
    const { brewerySlug } = body;
    const guestId = await inTransaction(db, (tx) =>
      acceptInvitation(tx, token, person, brewerySlug, clock.now()),
    );
    return { body: { guestId, brewerySlug } };
  },
);

export const guestRoutes = [list, invite, withdraw, preview, accept, leaveChainRoute];
