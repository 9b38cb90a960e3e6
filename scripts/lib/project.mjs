import { mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder; its path can hold spaces. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** Where everything that is made on this machine lies. */
export const dataFolder = join(root, '.data');

/** A folder under .data, made when it is missing. */
export function dataPath(...parts) {
  const path = join(dataFolder, ...parts);
  mkdirSync(path, { recursive: true });
  return path;
}

/** A failure with a message for the person at the terminal: no stack is shown. */
export class Plain extends Error {}

export function say(text) {
  process.stdout.write(`${text}\n`);
}
