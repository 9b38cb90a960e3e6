import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root, say } from './project.mjs';
import { must } from './run.mjs';

const sources = ['src', 'server', 'shared', 'content', 'public', 'index.html', 'vite.config.ts', 'package-lock.json'];

function* filesOf(path) {
  if (!existsSync(path)) return;
  if (!statSync(path).isDirectory()) {
    yield path;
    return;
  }
  for (const name of readdirSync(path).sort()) yield* filesOf(join(path, name));
}

/** A hash of everything a build is made from. */
function sourceHash() {
  const hash = createHash('sha256').update(process.version);
  for (const source of sources) {
    for (const file of filesOf(join(root, source))) {
      hash.update(file.slice(root.length)).update('\0').update(readFileSync(file));
    }
  }
  return hash.digest('hex');
}

const stampFile = join(root, 'dist', 'BUILT_FROM');

/** Builds client and server when the sources have changed since. */
export async function buildIfStale() {
  const wanted = sourceHash();
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return;
  say('Building ...');
  const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
  await must('The client build', process.execPath, [vite, 'build', '--logLevel', 'warn']);
  await must('The server build', process.execPath, [vite, 'build', '--ssr', '--logLevel', 'warn']);
  mkdirSync(join(root, 'dist'), { recursive: true });
  writeFileSync(stampFile, wanted);
}
