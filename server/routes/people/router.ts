import { asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import {
  joinLink as linkContract,
  joinLinkMade,
  joinLinkRequest,
  member as memberContract,
} from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { membership } from '../../db/schema/brewery.ts';
import { person } from '../../db/schema/people.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canInvite, canRead } from '../../policies.ts';
import { notFound } from '../../problems.ts';
import { listJoinLinks, makeJoinLink, withdrawJoinLink } from './joinLinks.ts';
import { presentMember } from './present.ts';

const members = forMember(
  {
    name: 'listMembers',
    method: 'get',
    path: pathOf(api.members(':brewery')),
    summary: 'Who belongs to the brewery, and as what',
    answer: z.array(memberContract),
    status: 200,
  },
  canRead,
  async ({ db }, { brewery }) => {
    const rows = await db
      .select({
        personId: person.id,
        name: person.name,
        role: membership.role,
        version: membership.version,
      })
      .from(membership)
      .innerJoin(person, eq(person.id, membership.personId))
      .where(eq(membership.breweryId, brewery.id))
      .orderBy(asc(membership.joinedAt), asc(person.name));
    return { body: rows.map(presentMember) };
  },
);

const links = pathOf(api.joinLinks(':brewery'));

const list = forMember(
  {
    name: 'listJoinLinks',
    method: 'get',
    path: links,
    summary: 'Invitations that were made',
    answer: z.array(linkContract),
    status: 200,
  },
  canInvite,
  async ({ db }, member) => ({ body: await listJoinLinks(db, member) }),
);

const make = forMember(
  {
    name: 'makeJoinLink',
    method: 'post',
    path: links,
    summary: 'Make a one-use invitation; its token is in this answer and nowhere else',
    body: joinLinkRequest,
    answer: joinLinkMade,
    status: 201,
    problems: ['already-exists'],
  },
  canInvite,
  async ({ db, clock, body }, member) => ({ body: await makeJoinLink(db, clock, member, body) }),
);

const withdraw = forMember(
  {
    name: 'withdrawJoinLink',
    method: 'delete',
    path: pathOf(api.joinLink(':brewery', ':id')),
    summary: 'Withdraw an invitation',
    answer: null,
    status: 204,
  },
  canInvite,
  async ({ db, params }, member) => {
    if (!(await withdrawJoinLink(db, member, params.id ?? ''))) throw notFound();
    return {};
  },
);

export const peopleRoutes = [members, list, make, withdraw];
