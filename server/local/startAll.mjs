import { rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { ensureBuild } from './build.mjs';
import { removeCluster, startCluster } from './cluster.mjs';
import { takeLock } from './lock.mjs';
import { ensurePackages } from './packages.mjs';
import { home, root } from './places.mjs';
import { birthOf } from './processes.mjs';
import { confirm, readArguments, say, Sentence } from './say.mjs';
import { sessionKeys } from './secrets.mjs';
import { awaitOrphan, lastLines, startServer } from './serverProcess.mjs';

const DEMO = [
  'Sign in, password slack-water-26:',
  '  mo@saltmarsh.example      head brewer',
  '  tamsin@saltmarsh.example  brewer',
  '  ruth@saltmarsh.example    taster',
];

/**
 * `npm start`: everything that one machine needs, started in order and stopped again in the opposite one.
 * @param {readonly string[]} args
 * @returns {Promise<number>}
 */
export async function start(args) {
  const options = readArguments(args, ['--dev', '--reset', '--yes'], 0);
  const dev = options.has('--dev');
  const stopAsked = onceAsked();
  const lock = await takeLock(join(home, 'lock'), 'npm start', (holder) =>
    holder.url === undefined
      ? `Another ${holder.what} is at work in ${home} (process ${holder.pid}).`
      : `Barmkin already runs here: ${holder.url} (process ${holder.pid}).`,
  );
  await awaitOrphan(lock.before?.server);
  await refuseTakenPort();
  await ensurePackages();
  if (options.has('--reset')) await reset(options.has('--yes'));
  const cluster = await startCluster(home);
  try {
    if (!dev) await ensureBuild(join(root, 'dist'));
    if (stopAsked.already()) return 0;
    say('Starting the server');
    const logFile = join(home, 'server.log');
    const server = await startServer(settings(cluster.url(), dev), logFile, (pid) =>
      lock.note({ server: { pid, birth: birthOf(pid) } }),
    );
    lock.note({ url: server.url });
    announce(server.url);
    const why = await Promise.race([stopAsked.promise, server.ended.then(() => 'ended')]);
    if (why === 'ended')
      say(`The server ended by itself. Its log, ${logFile}, ends:\n${lastLines(logFile)}`);
    else say('Stopping');
    lock.note({ stopping: true });
    await server.stop();
    return why === 'ended' ? 1 : 0;
  } finally {
    await cluster.stop();
  }
}

/**
 * @param {string} databaseUrl
 * @param {boolean} dev
 */
function settings(databaseUrl, dev) {
  return {
    BARMKIN_MODE: dev ? 'dev' : 'local',
    DATABASE_URL: databaseUrl,
    SESSION_KEYS: sessionKeys(home),
    DEMO: process.env.DEMO || 'yes',
    BARMKIN_DIST: join(root, 'dist'),
    PHOTOS_DIR: join(home, 'photos'),
    BACKUPS_DIR: join(home, 'backups'),
    NODE_ENV: dev ? 'development' : 'production',
  };
}

/** @param {string} url */
function announce(url) {
  say(`\nBarmkin is at ${url}\n`);
  if ((process.env.DEMO || 'yes') === 'yes') say(`${DEMO.join('\n')}\n`);
  say('Ctrl-C stops it.');
}

/** @param {boolean} yes */
async function reset(yes) {
  await confirm(`This deletes every brewery in ${home}, its photos too.`, yes);
  await removeCluster(home);
  rmSync(join(home, 'photos'), { recursive: true, force: true });
  say('Deleted; starting anew');
}

/** Said before the long steps, not after them. */
async function refuseTakenPort() {
  const port = Number(process.env.PORT || 4600);
  if (!Number.isInteger(port) || port < 0 || port > 65_535) return;
  if (await isTaken(port, process.env.HOST || '127.0.0.1'))
    throw new Sentence(
      `Port ${port} is taken by another program: PORT=${port + 1} npm start uses the next one.`,
    );
}

/**
 * @param {number} port
 * @param {string} host
 * @returns {Promise<boolean>}
 */
function isTaken(port, host) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.on('error', (/** @type {NodeJS.ErrnoException} */ error) =>
      resolve(error.code === 'EADDRINUSE'),
    );
    probe.listen(port, host, () => probe.close(() => resolve(false)));
  });
}

/** Waits for Ctrl-C and its kin. A second one does not hurry the first: everything is to be stopped in order. */
function onceAsked() {
  let asked = false;
  /** @type {Promise<string>} */
  const promise = new Promise((resolve) => {
    for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
      process.on(signal, () => {
        asked = true;
        resolve(signal);
      });
    }
    whenOrphaned(() => {
      asked = true;
      resolve('npm ended');
    });
  });
  return { promise, already: () => asked };
}

/**
 * When npm is killed, nobody is left to press Ctrl-C: then a start ends too.
 * @param {() => void} then
 */
function whenOrphaned(then) {
  if (process.env.npm_lifecycle_event === undefined) return;
  const parent = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(watch);
    then();
  }, 300);
  watch.unref();
}
