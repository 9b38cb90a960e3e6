import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root, say } from './project.mjs';
import { must } from './run.mjs';

const stampFile = join(root, 'node_modules', '.tankmark-install');

function stamp() {
  const hash = createHash('sha256').update(process.version);
  for (const file of ['package-lock.json', '.npmrc']) hash.update(readFileSync(join(root, file)));
  return hash.digest('hex');
}

/** Installs the packages of the lock file when they are missing or another lock file's. */
export async function installPackages() {
  const wanted = stamp();
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return;
  say('Installing packages (npm ci) ...');
  await must('npm ci', 'npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
  writeFileSync(stampFile, wanted);
}
