import { joined, joinPreview, joinRequest } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { demandUncommon } from '../../auth/commonPasswords.ts';
import { findSignedIn, personOf, startSession } from '../../auth/sessions.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forAnyone } from '../../http/route.ts';
import { makePerson } from '../account/commands.ts';
import { presentPerson } from '../account/present.ts';
import { belongs, demandNewPerson, findJoinLink, join, presentPreview } from './commands.ts';

const path = pathOf(api.join(':token'));

const preview = forAnyone(
  {
    name: 'readJoinLink',
    method: 'get',
    path,
    summary: 'What an invitation is for',
    answer: joinPreview,
    status: 200,
    problems: ['not-found', 'link-used', 'too-many'],
  },
  async ({ db, clock, req, params, tries }) => {
    await tries.count('joinByAddress', req.ip ?? '');
    const now = clock.now();
    const found = await findJoinLink(db, params.token ?? '', now);
    const personId = await personOf(db, now, req);
    return { body: presentPreview(found, await belongs(db, found.brewery.id, personId)) };
  },
);

const accept = forAnyone(
  {
    name: 'join',
    method: 'post',
    path,
    summary: 'Accept an invitation, as who is signed in or with a new account',
    body: joinRequest,
    answer: joined,
    status: 201,
    problems: ['not-found', 'link-used', 'already-exists', 'too-many', 'busy'],
  },
  async ({ db, clock, req, body, params, passwords, tries }) => {
    await tries.count('joinByAddress', req.ip ?? '');
    const { token = '' } = params;
    const now = clock.now();
    await findJoinLink(db, token, now);
    const signedIn = await findSignedIn(db, clock, req);
    if (signedIn) {
      const who = signedIn.person;
      const brewerySlug = await db.transaction((tx) => join(tx, token, who, now));
      return { body: { person: await presentPerson(db, who), brewerySlug } };
    }
    const { name, email, password } = demandNewPerson(body);
    demandUncommon(password);
    const passwordHash = await passwords.hash(password);
    const made = await db.transaction(async (tx) => {
      const who = await makePerson(tx, { name, email, passwordHash });
      const brewerySlug = await join(tx, token, who, now);
      await startSession(tx, clock, req, who.id);
      return { person: await presentPerson(tx, who), brewerySlug };
    });
    return { body: made };
  },
);

export const joinRoutes = [preview, accept];
