import { readFileSync } from 'node:fs';
import Keygrip from 'keygrip';
import { testServerFile } from '../../server/local/places.mjs';

export interface RunningServer {
  readonly url: string;
  readonly databaseUrl: string;
  readonly keys: string;
}

/** The server that the whole run shares. */
export function sharedServer(): RunningServer {
  return JSON.parse(readFileSync(testServerFile, 'utf8')) as RunningServer;
}

/** The signed cookie of a session, as the server would set it. */
export function sessionCookies({ url, keys }: RunningServer, token: string) {
  const value = Buffer.from(JSON.stringify({ token })).toString('base64');
  const signature = new Keygrip(keys.split(','), 'sha256').sign(`barmkin=${value}`);
  const common = { url, httpOnly: true, sameSite: 'Lax' } as const;
  return [
    { name: 'barmkin', value, ...common },
    { name: 'barmkin.sig', value: signature, ...common },
  ];
}
