import { emailChange, passwordChange } from '#shared/api/account.ts';
import { person } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { demandUncommon } from '../../auth/commonPasswords.ts';
import { demandOwnPassword } from '../../auth/ownPassword.ts';
import { forSignedIn } from '../../http/route.ts';
import { problem } from '../../problems.ts';
import { presentPerson } from './present.ts';
import { changeEmail, changePassword } from './secrets.ts';

const email = forSignedIn(
  {
    name: 'changeEmail',
    method: 'put',
    path: api.accountEmail,
    summary: 'Change the address that one signs in with; asks for the password',
    body: emailChange,
    answer: person,
    status: 200,
    ifMatch: true,
    problems: ['already-exists', 'too-many', 'busy'],
  },
  async (asked, { person: who }) => {
    const { db, body, version } = asked;
    await demandOwnPassword(asked, who, body.password);
    const edited = await changeEmail(db, who, version, body.email);
    if (!edited) throw problem('changed-since', { current: await presentPerson(db, who) });
    return { body: await presentPerson(db, edited), version: edited.version };
  },
);

const password = forSignedIn(
  {
    name: 'changePassword',
    method: 'put',
    path: api.accountPassword,
    summary: 'Change the password; signs out everywhere else',
    body: passwordChange,
    answer: null,
    status: 204,
    problems: ['too-many', 'busy'],
  },
  async (asked, signedIn) => {
    const { db, body, passwords } = asked;
    demandUncommon(body.newPassword, '/newPassword');
    await demandOwnPassword(asked, signedIn.person, body.password);
    await changePassword(db, signedIn, await passwords.hash(body.newPassword));
    return {};
  },
);

export const secretRoutes = [email, password];
