import { join } from 'node:path';
import { testDist, testHome } from './places.mjs';
import { must } from './run.mjs';
import { startServer } from './serverProcess.mjs';
import { joinCluster } from './sharedCluster.mjs';

/** The keys sign the cookies of fixtures too, which is how a test is signed in without a form. */
const KEYS = 'a-key-for-tests-only-1,a-key-for-tests-only-2';

/** Tests come from one address and sign in often; the limits have tests of their own. */
const LIMITS = Object.fromEntries(
  [
    'signInByAccountAndAddress',
    'signInByAddress',
    'signUpByAddress',
    'joinByAddress',
    'clientErrorsByAddress',
    'checksByPerson',
  ].map((name) => [name, { points: 100_000, seconds: 60 }]),
);

/**
 * A server process with a database of its own on the tests' cluster, or on the one that `join` gives.
 * @param {{
 *   port: number,
 *   logFile: string,
 *   settings?: Record<string, string>,
 *   join?: () => ReturnType<typeof joinCluster>,
 * }} options port 0: any free one
 */
export async function startTestServer({
  port,
  logFile,
  settings = {},
  join: joinOther = () => joinCluster(testHome),
}) {
  const { cluster, leave } = await joinOther();
  const name = `e2e_${process.pid}_${Date.now().toString(36)}`;
  const sql = (/** @type {string} */ statement) =>
    must(
      'A test database',
      join(cluster.bin, 'psql'),
      ['-X', '-q', '-d', 'postgres', '-c', statement],
      {
        env: cluster.env,
      },
    );
  await sql(`create database ${name}`);
  const databaseUrl = cluster.url(name);
  const start = (/** @type {number} */ on, /** @type {Record<string, string>} */ changed = {}) =>
    startServer(
      {
        BARMKIN_MODE: 'test',
        DATABASE_URL: databaseUrl,
        SESSION_KEYS: KEYS,
        LIMITS: JSON.stringify(LIMITS),
        BARMKIN_DIST: testDist,
        DEMO: 'no',
        HOST: '127.0.0.1',
        PORT: String(on),
        PUBLIC_URL: '',
        NODE_ENV: 'production',
        ...settings,
        ...changed,
      },
      logFile,
    );
  let server = await start(port);
  const close = async () => {
    await server.stop();
    await sql(`drop database if exists ${name} with (force)`);
    await leave();
  };
  return {
    url: server.url,
    databaseUrl,
    keys: KEYS,
    ended: server.ended,
    /** Of its first process: it has another after `again`. */
    pid: server.pid,
    /** Ends the server as a power cut would. */
    kill: async () => {
      process.kill(server.pid, 'SIGKILL');
      await server.ended;
    },
    /** Starts it again at the same address, after a kill, with some settings changed. */
    again: async (/** @type {Record<string, string>} */ changed = {}) => {
      server = await start(Number(new URL(server.url).port), changed);
    },
    close,
  };
}
