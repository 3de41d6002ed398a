import { z } from 'zod';
import { handOver as handOverBody, roleChange } from '#shared/api/membership.ts';
import { member as memberContract } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canManagePeople, canRead } from '../../policies.ts';
import { leaveBrewery, removeMember } from './leave.ts';
import { changeRole, handOver } from './roles.ts';

const one = pathOf(api.member(':brewery', ':id'));

const change = forMember(
  {
    name: 'changeRole',
    method: 'patch',
    path: one,
    summary: 'Change what somebody may do in the brewery',
    body: roleChange,
    answer: memberContract,
    status: 200,
    ifMatch: true,
    problems: ['last-head-brewer'],
  },
  canManagePeople,
  async (asked, member) => {
    const { params, version, body } = asked;
    const row = await changeRole(asked, member, params.id ?? '', version, body.role);
    return { body: row, version: row.version };
  },
);

const remove = forMember(
  {
    name: 'removeMember',
    method: 'delete',
    path: one,
    summary: 'Remove somebody from the brewery; what they did stays in the record',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['last-head-brewer'],
  },
  canManagePeople,
  async (asked, member) => {
    await removeMember(asked, member, asked.params.id ?? '', asked.version);
    return {};
  },
);

const hand = forMember(
  {
    name: 'handOver',
    method: 'post',
    path: pathOf(api.handOver(':brewery', ':id')),
    summary: 'Make somebody head brewer, and step down oneself where wished',
    body: handOverBody,
    answer: z.array(memberContract),
    status: 200,
    ifMatch: true,
  },
  canManagePeople,
  async (asked, member) => {
    const { params, version, body } = asked;
    return { body: await handOver(asked, member, params.id ?? '', version, body) };
  },
);

const leave = forMember(
  {
    name: 'leaveBrewery',
    method: 'delete',
    path: pathOf(api.membership(':brewery')),
    summary: 'Leave a brewery',
    answer: null,
    status: 204,
    ifMatch: true,
    problems: ['last-head-brewer'],
  },
  canRead,
  async (asked, member) => {
    await leaveBrewery(asked, member, asked.version);
    return {};
  },
);

export const membershipRoutes = [change, remove, hand, leave];
