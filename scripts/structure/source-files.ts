import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join, relative } from 'node:path';
import ts from 'typescript';

export interface SourceFile {
  /** Path from the project's folder. */
  path: string;
  lines: string[];
  tree: ts.SourceFile;
}

const folders = ['src', 'server', 'shared', 'scripts'];
const extensions = /\.(ts|tsx|mjs)$/;
const skipped = /\.(test|spec)\.(ts|tsx)$|\.d\.mts$|\.d\.ts$/;

function* walk(folder: string): Generator<string> {
  for (const name of readdirSync(folder)) {
    const path = join(folder, name);
    if (statSync(path).isDirectory()) yield* walk(path);
    else if (extensions.test(name) && !skipped.test(name)) yield path;
  }
}

/** Every source file that the measures apply to: tests, content and generated files are left out. */
export function sourceFiles(root: string): SourceFile[] {
  return folders.flatMap((folder) =>
    [...walk(join(root, folder))].map((path) => {
      const text = readFileSync(path, 'utf8');
      const kind = path.endsWith('x') ? ts.ScriptKind.TSX : ts.ScriptKind.TS;
      return {
        path: relative(root, path),
        lines: text.replace(/\n$/, '').split('\n'),
        tree: ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true, kind),
      };
    }),
  );
}
