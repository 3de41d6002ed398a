import { person, signInRequest } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { endSession, startSession } from '../../auth/sessions.ts';
import { forAnyone, forSignedIn } from '../../http/route.ts';
import { problem } from '../../problems.ts';
import { findByEmail } from '../account/commands.ts';
import { presentPerson } from '../account/present.ts';

const signIn = forAnyone(
  {
    name: 'signIn',
    method: 'post',
    path: api.session,
    summary: 'Sign in; the answer sets the cookie',
    body: signInRequest,
    answer: person,
    status: 200,
    problems: ['wrong-sign-in', 'too-many', 'busy'],
  },
  async ({ db, clock, req, body, passwords, tries }) => {
    const from = req.ip ?? '';
    const email = body.email.trim().toLowerCase();
    await tries.count('signInByAddress', from);
    await tries.count('signInByAccountAndAddress', email, from);
    const who = storable(email) ? await findByEmail(db, email) : null;
    const right = await passwords.matches(who?.passwordHash ?? null, body.password);
    if (!who || !right) throw problem('wrong-sign-in');
    // Only wrong tries count.
    await tries.forget('signInByAddress', from);
    await tries.forget('signInByAccountAndAddress', email, from);
    await startSession(db, clock, req, who.id);
    return { body: await presentPerson(db, who), version: who.version };
  },
);

/** PostgreSQL has no NUL in text, so no account has one either. */
const storable = (text: string) => !text.includes('\0');

const whoAmI = forSignedIn(
  {
    name: 'whoIsSignedIn',
    method: 'get',
    path: api.session,
    summary: 'Who is signed in',
    answer: person,
    status: 200,
  },
  async ({ db }, { person: who }) => ({
    body: await presentPerson(db, who),
    version: who.version,
  }),
);

/** Whoever is not signed in is signed out already. */
const signOut = forAnyone(
  {
    name: 'signOut',
    method: 'delete',
    path: api.session,
    summary: 'Sign out',
    answer: null,
    status: 204,
  },
  async ({ db, req }) => {
    await endSession(db, req);
    return {};
  },
);

export const sessionRoutes = [signIn, whoAmI, signOut];
