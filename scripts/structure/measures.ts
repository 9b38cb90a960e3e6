import { dirname, join, normalize } from 'node:path';
import ts from 'typescript';
import type { SourceFile } from './source-files.ts';

/** A measure that is over its bar names the places. */
export interface Measure {
  name: string;
  figure: number;
  bar: number;
  places: string[];
}

function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? 0;
}

const bars = { median: 60, ninetieth: 200, longest: 350, function: 80, component: 120, duplicatedPercent: 1.5 };

// Catalogues of words and unit tables are data, not code: their length says nothing.
const dataFiles = /^(src\/i18n\/|shared\/quantity\/unit-(names|aliases)\.ts|server\/outside\/messages\/)/;

export function fileLengths(files: readonly SourceFile[]): Measure[] {
  const code = files.filter((file) => !dataFiles.test(file.path));
  const lengths = code.map((file) => file.lines.length);
  const long = code.filter((file) => file.lines.length > bars.longest);
  return [
    { name: 'lines of a file, median', figure: quantile(lengths, 0.5), bar: bars.median, places: [] },
    { name: 'lines of a file, 90th percentile', figure: quantile(lengths, 0.9), bar: bars.ninetieth, places: [] },
    {
      name: 'lines of the longest file',
      figure: Math.max(...lengths),
      bar: bars.longest,
      places: long.map((file) => `${file.path} (${file.lines.length})`),
    },
  ];
}

function isFunction(node: ts.Node): node is ts.FunctionLikeDeclaration {
  return (
    ts.isFunctionDeclaration(node) ||
    ts.isFunctionExpression(node) ||
    ts.isArrowFunction(node) ||
    ts.isMethodDeclaration(node) ||
    ts.isConstructorDeclaration(node)
  );
}

function returnsJsx(node: ts.Node): boolean {
  return (
    ts.isJsxElement(node) ||
    ts.isJsxSelfClosingElement(node) ||
    ts.isJsxFragment(node) ||
    !!ts.forEachChild(node, (child) => returnsJsx(child) || undefined)
  );
}

/** A function that only gathers other functions (a service, a repo) is as long as they are: they are measured alone. */
function ownLines(file: SourceFile, node: ts.FunctionLikeDeclaration): number {
  const line = (position: number) => file.tree.getLineAndCharacterOfPosition(position).line;
  const lines = (inner: ts.Node) => line(inner.getEnd()) - line(inner.getStart()) + 1;
  let own = lines(node);
  const visit = (inner: ts.Node): void => {
    const isMember = ts.isMethodDeclaration(inner) || ts.isFunctionDeclaration(inner);
    const isProperty = ts.isPropertyAssignment(inner) && isFunction(inner.initializer);
    if (isMember || isProperty) own -= lines(inner) - 1;
    else ts.forEachChild(inner, visit);
  };
  ts.forEachChild(node, visit);
  return own;
}

export function functionLengths(files: readonly SourceFile[]): Measure[] {
  const found: { component: boolean; lines: number; place: string }[] = [];
  for (const file of files) {
    const visit = (node: ts.Node): void => {
      if (isFunction(node)) {
        const line = file.tree.getLineAndCharacterOfPosition(node.getStart()).line + 1;
        const component = file.path.endsWith('.tsx') && returnsJsx(node);
        found.push({ component, lines: ownLines(file, node), place: `${file.path}:${line}` });
      }
      ts.forEachChild(node, visit);
    };
    visit(file.tree);
  }
  return [false, true].map((component) => {
    const bar = component ? bars.component : bars.function;
    const kind = found.filter((one) => one.component === component);
    return {
      name: `lines of the longest ${component ? 'component' : 'function'}`,
      figure: Math.max(0, ...kind.map((one) => one.lines)),
      bar,
      places: kind.filter((one) => one.lines > bar).map((one) => `${one.place} (${one.lines})`),
    };
  });
}

function importsOf(file: SourceFile): string[] {
  const found: string[] = [];
  for (const statement of file.tree.statements) {
    if (!ts.isImportDeclaration(statement) && !ts.isExportDeclaration(statement)) continue;
    const typeOnly = ts.isImportDeclaration(statement) ? statement.importClause?.isTypeOnly : statement.isTypeOnly;
    const target = statement.moduleSpecifier;
    if (typeOnly || !target || !ts.isStringLiteral(target) || !target.text.startsWith('.')) continue;
    found.push(normalize(join(dirname(file.path), target.text)));
  }
  return found;
}

/** Circles of imports; types do not count, since they are gone when the program runs. */
export function importCycles(files: readonly SourceFile[]): Measure {
  const graph = new Map(files.map((file) => [file.path, importsOf(file)]));
  const state = new Map<string, 'open' | 'done'>();
  const cycles: string[] = [];
  const visit = (path: string, trail: readonly string[]): void => {
    if (state.get(path) === 'done' || !graph.has(path)) return;
    if (state.get(path) === 'open') {
      cycles.push([...trail.slice(trail.indexOf(path)), path].join(' -> '));
      return;
    }
    state.set(path, 'open');
    for (const next of graph.get(path) ?? []) visit(next, [...trail, path]);
    state.set(path, 'done');
  };
  for (const path of graph.keys()) visit(path, []);
  return { name: 'circles of imports', figure: cycles.length, bar: 0, places: cycles };
}

export function escapes(files: readonly SourceFile[]): Measure {
  const places: string[] = [];
  for (const file of files) {
    const visit = (node: ts.Node): void => {
      if (node.kind === ts.SyntaxKind.AnyKeyword) {
        places.push(`${file.path}:${file.tree.getLineAndCharacterOfPosition(node.getStart()).line + 1}`);
      }
      ts.forEachChild(node, visit);
    };
    visit(file.tree);
    file.lines.forEach((line, index) => {
      if (/@ts-(ignore|nocheck|expect-error)/.test(line)) places.push(`${file.path}:${index + 1}`);
    });
  }
  return { name: 'uses of any, checks of types switched off', figure: places.length, bar: 0, places };
}

const documentedFolders = /^(shared\/quantity|shared\/formulas|server\/learning|server\/problems)\//;
// A family documents itself by the contract's fields: title, sources, statement.
const familyFolder = /^server\/problems\/(families|labels)\//;

export function documentation(files: readonly SourceFile[]): Measure {
  const places: string[] = [];
  for (const file of files) {
    if (!documentedFolders.test(file.path) || familyFolder.test(file.path)) continue;
    for (const statement of file.tree.statements) {
      const exported =
        ts.canHaveModifiers(statement) &&
        ts.getModifiers(statement)?.some((one) => one.kind === ts.SyntaxKind.ExportKeyword);
      if (
        !exported ||
        !(
          ts.isFunctionDeclaration(statement) ||
          ts.isVariableStatement(statement) ||
          ts.isInterfaceDeclaration(statement) ||
          ts.isClassDeclaration(statement)
        )
      )
        continue;
      if (ts.getJSDocCommentsAndTags(statement).length > 0) continue;
      places.push(`${file.path}:${file.tree.getLineAndCharacterOfPosition(statement.getStart()).line + 1}`);
    }
  }
  return { name: 'exports of the pure core without a comment', figure: places.length, bar: 0, places };
}

const windowLines = 8;

/** Share of lines inside blocks of eight or more equal lines that stand in two places; imports and short lines aside. */
export function duplication(files: readonly SourceFile[]): Measure {
  const seen = new Map<string, { file: number; line: number }>();
  const repeated = new Set<string>();
  const places = new Set<string>();
  let total = 0;
  files.forEach((file, fileIndex) => {
    const lines = file.lines
      .map((text, index) => ({ text: text.trim(), line: index + 1 }))
      .filter(({ text }) => text.length > 3 && !/^(import|export \{|\} from|\/\/|\*|\/\*)/.test(text));
    total += lines.length;
    for (let start = 0; start + windowLines <= lines.length; start += 1) {
      const block = lines.slice(start, start + windowLines);
      const key = block.map(({ text }) => text).join('\n');
      const first = seen.get(key);
      const line = block[0]?.line ?? 0;
      if (!first) {
        seen.set(key, { file: fileIndex, line });
        continue;
      }
      for (const one of block) repeated.add(`${fileIndex}:${one.line}`);
      places.add(`${files[first.file]?.path}:${first.line} and ${file.path}:${line}`);
    }
  });
  const percent = (100 * repeated.size) / Math.max(1, total);
  return {
    name: 'percent of lines in repeated blocks',
    figure: Number(percent.toFixed(2)),
    bar: bars.duplicatedPercent,
    places: [...places],
  };
}
