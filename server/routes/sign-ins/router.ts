import { z } from 'zod';
import { signInPlace } from '#shared/api/account.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forSignedIn } from '../../http/route.ts';
import { notFound } from '../../problems.ts';
import { endOtherSignIns, endSignIn, listSignIns } from './commands.ts';

const list = forSignedIn(
  {
    name: 'listSignIns',
    method: 'get',
    path: api.signIns,
    summary: 'Where one is signed in',
    answer: z.array(signInPlace),
    status: 200,
  },
  async ({ db, clock }, signedIn) => ({ body: await listSignIns(db, signedIn, clock.now()) }),
);

const endOne = forSignedIn(
  {
    name: 'endSignIn',
    method: 'delete',
    path: pathOf(api.signInOf(':mark')),
    summary: 'Sign out somewhere',
    answer: null,
    status: 204,
    problems: ['not-found'],
  },
  async ({ db, params }, signedIn) => {
    if (!(await endSignIn(db, signedIn, params.mark ?? ''))) throw notFound();
    return {};
  },
);

const endOthers = forSignedIn(
  {
    name: 'endOtherSignIns',
    method: 'delete',
    path: api.signIns,
    summary: 'Sign out everywhere but here',
    answer: null,
    status: 204,
  },
  async ({ db }, signedIn) => {
    await endOtherSignIns(db, signedIn);
    return {};
  },
);

export const signInRoutes = [list, endOne, endOthers];
