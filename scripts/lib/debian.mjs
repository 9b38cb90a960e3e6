import { existsSync, mkdirSync, readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Plain, say } from './project.mjs';
import { cleanEnv, must, run } from './run.mjs';

const isRoot = () => process.getuid?.() === 0;

let updated = false;
async function aptInstall(packages, why) {
  if (!isRoot()) {
    throw new Plain(`${why} is missing. As root: apt-get install ${packages.join(' ')}`);
  }
  say(`Installing ${why} (apt-get install ${packages.join(' ')}) ...`);
  const env = cleanEnv({ DEBIAN_FRONTEND: 'noninteractive' });
  if (!updated) await must('apt-get update', 'apt-get', ['update', '-qq'], { env });
  updated = true;
  await must('apt-get install', 'apt-get', ['install', '-y', '-qq', '--no-install-recommends', ...packages], { env });
}

const versions = '/usr/lib/postgresql';

function findPostgres() {
  if (!existsSync(versions)) return null;
  const found = readdirSync(versions)
    .filter(
      (version) =>
        existsSync(join(versions, version, 'bin', 'initdb')) && existsSync(join(versions, version, 'bin', 'postgres')),
    )
    .sort((a, b) => Number(b) - Number(a))[0];
  return found === undefined ? null : join(versions, found, 'bin');
}

/** The folder of PostgreSQL's programs; installs Debian's package when there is none. */
export async function postgresBin() {
  const found = findPostgres();
  if (found) return found;
  // No cluster of the system's own: the product keeps its cluster in its own folder.
  if (isRoot()) {
    mkdirSync('/etc/postgresql-common', { recursive: true });
    const file = '/etc/postgresql-common/createcluster.conf';
    if (!existsSync(file)) writeFileSync(file, 'create_main_cluster = false\n');
  }
  await aptInstall(['postgresql'], 'PostgreSQL');
  const installed = findPostgres();
  if (!installed)
    throw new Plain('PostgreSQL was installed, but its programs were not found under /usr/lib/postgresql.');
  return installed;
}

export const chromiumPath = '/usr/bin/chromium';

/** Debian's Chromium, for the browser tests. */
export async function chromium() {
  if (existsSync(chromiumPath)) return chromiumPath;
  await aptInstall(['chromium'], 'Chromium');
  return chromiumPath;
}

/** The ids of the account that runs PostgreSQL when we are root; PostgreSQL refuses to run as root itself. */
export async function postgresIds() {
  if (!isRoot()) return {};
  const ask = async (flag) => {
    const { code, output } = await run('id', [flag, 'postgres'], { capture: true });
    if (code !== 0) throw new Plain('The account "postgres" is missing: install Debian\'s postgresql package.');
    return Number(output.trim());
  };
  return { uid: await ask('-u'), gid: await ask('-g') };
}
