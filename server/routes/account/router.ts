import { accountPatch, person, signUpRequest } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { demandUncommon } from '../../auth/commonPasswords.ts';
import { startSession } from '../../auth/sessions.ts';
import { forAnyone, forSignedIn } from '../../http/route.ts';
import { problem } from '../../problems.ts';
import { editPerson, makeBrewery, makePerson } from './commands.ts';
import { demandTimeZone } from './defaults.ts';
import { presentPerson } from './present.ts';

const signUp = forAnyone(
  {
    name: 'signUp',
    method: 'post',
    path: api.account,
    summary: 'Make an account, and with it a brewery and its first season',
    body: signUpRequest,
    answer: person,
    status: 201,
    problems: ['already-exists', 'too-many', 'busy'],
  },
  async ({ db, clock, req, body, passwords, tries }) => {
    await tries.count('signUpByAddress', req.ip ?? '');
    const timeZone = body.timeZone === undefined ? undefined : demandTimeZone(body.timeZone);
    demandUncommon(body.password);
    const passwordHash = await passwords.hash(body.password);
    const made = await db.transaction(async (tx) => {
      const row = await makePerson(tx, { name: body.name, email: body.email, passwordHash });
      await makeBrewery(tx, row, { breweryName: body.breweryName, timeZone });
      await startSession(tx, clock, req, row.id);
      return presentPerson(tx, row);
    });
    return { body: made, version: made.version };
  },
);

const editAccount = forSignedIn(
  {
    name: 'editAccount',
    method: 'patch',
    path: api.account,
    summary: 'Change one’s own name, units or theme',
    body: accountPatch,
    answer: person,
    status: 200,
    ifMatch: true,
  },
  async ({ db, body, version }, { person: who }) => {
    const edited = await db.transaction((tx) => editPerson(tx, who.id, version, body));
    if (!edited) throw problem('changed-since', { current: await presentPerson(db, who) });
    return { body: await presentPerson(db, edited), version: edited.version };
  },
);

export const accountRoutes = [signUp, editAccount];
