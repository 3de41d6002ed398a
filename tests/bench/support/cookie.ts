import { sessionCookies } from '../../../e2e/support/server.ts';
import type { AtWork } from './atWork.ts';

/** The header of somebody who is signed in. */
export const cookieOf = (at: Pick<AtWork, 'url' | 'databaseUrl' | 'keys'>, token: string): string =>
  sessionCookies(at, token)
    .map(({ name, value }) => `${name}=${value}`)
    .join('; ');
