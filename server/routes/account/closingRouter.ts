import { accountClosing, accountData, closingPreview as contract } from '#shared/api/account.ts';
import { api } from '#shared/api/urls.ts';
import { takeCookie } from '../../auth/cookie.ts';
import { demandOwnPassword } from '../../auth/ownPassword.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { forSignedIn } from '../../http/route.ts';
import { closeAccount, closingPreview } from './closing.ts';
import { dataOf } from './takeAlong.ts';

const preview = forSignedIn(
  {
    name: 'readClosing',
    method: 'get',
    path: api.accountClosing,
    summary: 'What closing the account would do: what goes with it, and what stands against it',
    answer: contract,
    status: 200,
  },
  async ({ db }, { person }) => ({ body: await closingPreview(db, person.id) }),
);

const data = forSignedIn(
  {
    name: 'takeDataAlong',
    method: 'get',
    path: api.accountData,
    summary: 'All that would go with the account, as a file of JSON',
    answer: accountData,
    status: 200,
  },
  async ({ db, res }, { person: { id, name, email } }) => {
    res.attachment('barmkin-data.json');
    const { goes } = await closingPreview(db, id);
    const breweries = [];
    for (const each of goes) breweries.push(await dataOf(db, each.id));
    return { body: { account: { name, email }, breweries } };
  },
);

const close = forSignedIn(
  {
    name: 'closeAccount',
    method: 'post',
    path: api.accountClosing,
    summary: 'Close the account, and end the breweries that nobody else belongs to',
    body: accountClosing,
    answer: null,
    status: 204,
    problems: ['last-head-brewer', 'changed-since', 'too-many', 'busy'],
  },
  async (asked, { person }) => {
    const { db, clock, req, body } = asked;
    await demandOwnPassword(asked, person, body.password);
    await inTransaction(db, (tx) => closeAccount(tx, person, body.losing, clock.now()));
    takeCookie(req);
    return {};
  },
);

export const closingRoutes = [preview, data, close];
