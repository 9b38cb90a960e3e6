import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { parse } from 'yaml';
import type { z } from 'zod';
import { lessonFrontSchema } from '../../../shared/contracts/lessons.ts';
import { locales, topics, type Locale } from '../../../shared/vocabulary.ts';

export interface Lesson extends z.infer<typeof lessonFrontSchema> {
  slug: string;
  number: number;
  checkpoints: string[];
}
/** Lessons by language, each list in the order of the course. */
export type LessonCatalogue = Readonly<Record<Locale, readonly Lesson[]>>;

const fileName = /^(\d+)-([a-z0-9-]+)\.mdx$/;
const frontMatter = /^---\r?\n([\s\S]*?)\r?\n---/;
const checkpointTag = /<Checkpoint\b[^>]*?\bid="([a-z0-9-]+)"/g;

async function readLesson(folder: string, name: string): Promise<Lesson | null> {
  const named = fileName.exec(name);
  if (!named) return null;
  const text = await readFile(join(folder, name), 'utf8');
  const front = lessonFrontSchema.safeParse(parse(frontMatter.exec(text)?.[1] ?? ''));
  if (!front.success) throw new Error(`The front matter of ${name} is not as expected: ${front.error.message}`);
  const checkpoints = [...text.matchAll(checkpointTag)].flatMap((match) => match[1] ?? []);
  return { ...front.data, slug: named[2] ?? '', number: Number(named[1]), checkpoints };
}

async function namesIn(folder: string): Promise<string[]> {
  try {
    return await readdir(folder);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return [];
    throw error;
  }
}

async function readLanguage(folder: string): Promise<Lesson[]> {
  const lists = await Promise.all(
    topics.map(async (topic) => {
      const names = await namesIn(join(folder, topic));
      const found = await Promise.all(names.map((name) => readLesson(join(folder, topic), name)));
      return found.filter((lesson) => lesson !== null).sort((a, b) => a.number - b.number);
    }),
  );
  return lists.flat();
}

/** Reads the front matter of every lesson; a lesson without a translation stands in the English text. */
export async function readCatalogue(contentFolder: string): Promise<LessonCatalogue> {
  const read = await Promise.all(locales.map((locale) => readLanguage(join(contentFolder, 'lessons', locale))));
  const [en = [], es = []] = read;
  const translated = new Map(es.map((lesson) => [lesson.slug, lesson]));
  return { en, es: en.map((lesson) => translated.get(lesson.slug) ?? lesson) };
}
