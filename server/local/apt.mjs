import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { isRoot } from './places.mjs';
import { must, run } from './run.mjs';
import { say, Sentence } from './say.mjs';

const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
let updated = false;

/**
 * Installs Debian packages, or says how.
 * @param {string} what the thing in words
 * @param {readonly string[]} packages
 */
export async function aptInstall(what, packages) {
  const command = `apt-get install -y ${packages.join(' ')}`;
  const hasApt = (await run('apt-get', ['--version'])).code === 0;
  if (!isRoot || !hasApt) {
    throw new Sentence(
      hasApt
        ? `${what} is missing: sudo ${command} installs it.`
        : `${what} is missing: install it with your system's packages, so that it is on the PATH.`,
    );
  }
  say(`Installing ${what} (${command})`);
  if (!updated) await must('apt-get update', 'apt-get', ['update', '-q'], { env });
  updated = true;
  const args = ['install', '-y', '-q', '--no-install-recommends', ...packages];
  await must(`Installing ${what}`, 'apt-get', args, { env });
}

const CLUSTER_SETTINGS = '/etc/postgresql-common/createcluster.conf';

/** PostgreSQL's programs, without the database that the package would otherwise make and start. */
export async function aptInstallPostgres() {
  await aptInstall('PostgreSQL', ['postgresql-common']);
  if (hasSystemCluster() || !existsSync(CLUSTER_SETTINGS)) {
    return aptInstall('PostgreSQL', ['postgresql']);
  }
  const before = readFileSync(CLUSTER_SETTINGS, 'utf8');
  const without = before.replace(/^\s*#?\s*create_main_cluster\s*=.*$/m, '');
  writeFileSync(CLUSTER_SETTINGS, `${without}\ncreate_main_cluster = false\n`);
  try {
    await aptInstall('PostgreSQL', ['postgresql']);
  } finally {
    writeFileSync(CLUSTER_SETTINGS, before);
  }
}

function hasSystemCluster() {
  try {
    return readdirSync('/etc/postgresql').length > 0;
  } catch {
    return false;
  }
}
