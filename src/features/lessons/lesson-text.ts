import type { MDXContent } from 'mdx/types';
import { lazy } from 'react';
import type { Locale, Topic } from '../../../shared/vocabulary.ts';

/** What a lesson's file exports: its text, and of its front matter what stands at the foot. */
export interface LessonModule {
  default: MDXContent;
  frontmatter: {
    sources?: { title: string; publisher: string; year?: number | string | null; ref?: string | null }[];
    revised?: string | Date;
  };
}

// Each lesson is its own file in the build, fetched when it is opened.
const files = import.meta.glob<LessonModule>('../../../content/lessons/*/*/*.mdx');

function fileOf(locale: Locale, topic: Topic, slug: string): (() => Promise<LessonModule>) | null {
  const folder = `/content/lessons/${locale}/${topic}/`;
  const path = Object.keys(files).find(
    (name) => name.includes(folder) && name.replace(/^.*\/\d+-/, '') === `${slug}.mdx`,
  );
  return (path !== undefined && files[path]) || null;
}

export interface FoundLesson {
  load: () => Promise<LessonModule>;
  /** The language its text is in: English where there is no translation yet. */
  locale: Locale;
}

/** Finds a lesson's text in the reader's language, or in English. */
export function findLesson(locale: Locale, topic: Topic, slug: string): FoundLesson | null {
  const own = fileOf(locale, topic, slug);
  if (own) return { load: own, locale };
  const english = fileOf('en', topic, slug);
  return english && { load: english, locale: 'en' };
}

const texts = new Map<string, ReturnType<typeof lazy<LessonModule['default']>>>();

/** The lesson as a component, made once for each file. */
export function lessonComponent(found: FoundLesson, key: string) {
  const known = texts.get(key);
  if (known) return known;
  const made = lazy(async () => ({ default: (await found.load()).default }));
  texts.set(key, made);
  return made;
}
