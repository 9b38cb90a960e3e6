import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder: the nearest one upwards with a package.json, from the sources and from the build alike. */
export const projectRoot = ((): string => {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (!existsSync(join(folder, 'package.json'))) {
    const parent = dirname(folder);
    if (parent === folder) throw new Error('The project folder was not found: no package.json above the server.');
    folder = parent;
  }
  return folder;
})();
