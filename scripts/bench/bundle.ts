import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { projectRoot } from '../../server/project-root.ts';
import type { BenchFigure } from './figure.ts';

const mostKilobytes = 130;
const mostLessonKilobytes = 25;

interface Chunk {
  file: string;
  isEntry?: boolean;
  imports?: string[];
  src?: string;
}
type Manifest = Record<string, Chunk>;

const client = join(projectRoot, 'dist', 'client');

function readManifest(): Manifest {
  return JSON.parse(readFileSync(join(client, '.vite', 'manifest.json'), 'utf8')) as Manifest;
}

/** The chunk and everything it imports at once. */
function withImports(manifest: Manifest, key: string, found = new Set<string>()): Set<string> {
  const chunk = manifest[key];
  if (!chunk || found.has(chunk.file)) return found;
  found.add(chunk.file);
  for (const next of chunk.imports ?? []) withImports(manifest, next, found);
  return found;
}

function gzipped(files: Iterable<string>): number {
  let bytes = 0;
  for (const file of files)
    if (file.endsWith('.js')) bytes += gzipSync(readFileSync(join(client, file)), { level: 9 }).length;
  return bytes / 1000;
}

/**
 * JavaScript of a first visit to a lesson, in the English of most readers: the entry, the lesson's page, the lesson, and the
 * work of its checkpoints, which is fetched as the reader comes near.
 */
export function benchBundle(): BenchFigure[] {
  const manifest = readManifest();
  const entry = Object.keys(manifest).find((key) => manifest[key]?.isEntry);
  const page = Object.keys(manifest).find((key) => key.endsWith('pages/course/lesson.tsx'));
  const checkpoint = Object.keys(manifest).find((key) => key.endsWith('practice/checkpoint-work.tsx'));
  const lessons = Object.keys(manifest).filter((key) => key.endsWith('.mdx'));
  if (entry === undefined || page === undefined || checkpoint === undefined || lessons.length === 0)
    throw new Error('the build holds no lesson page');
  const shell = withImports(manifest, checkpoint, withImports(manifest, page, withImports(manifest, entry)));
  const scheme = readFileSync(join(client, 'scheme.js'));
  const base = gzipped(shell) + gzipSync(scheme).length / 1000;
  const own = lessons.map((lesson) => gzipped([...withImports(manifest, lesson)].filter((file) => !shell.has(file))));
  const largest = Math.max(...own);
  const charts = readdirSync(join(client, 'assets')).filter((name) => /recharts|chart\.js|d3-/.test(name)).length;
  return [
    {
      name: 'bundle',
      figure: base + largest,
      unit: 'kB of JavaScript gzipped, first visit to the largest lesson, its checkpoints included',
      bar: mostKilobytes,
      atLeast: false,
    },
    {
      name: 'bundle-lesson',
      figure: largest,
      unit: 'kB gzipped, the largest lesson beyond the shell',
      bar: mostLessonKilobytes,
      atLeast: false,
    },
    { name: 'bundle-charts', figure: charts, unit: 'chart libraries in the build', bar: 0, atLeast: false },
  ];
}
