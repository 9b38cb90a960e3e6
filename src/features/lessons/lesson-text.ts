import { queryOptions } from '@tanstack/react-query';
import type { MDXContent } from 'mdx/types';

import type { Locale } from '../../../shared/vocabulary.ts';

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

function fileOf(locale: Locale, topic: string, slug: string): (() => Promise<LessonModule>) | null {
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
export function findLesson(locale: Locale, topic: string, slug: string): FoundLesson | null {
  const own = fileOf(locale, topic, slug);
  if (own) return { load: own, locale };
  const english = fileOf('en', topic, slug);
  return english && { load: english, locale: 'en' };
}

/** A lesson's text, fetched once. What its file exports is code, so it is neither compared nor fetched anew. */
export const lessonTextQuery = ({ load, locale }: FoundLesson, slug: string) =>
  queryOptions({
    queryKey: ['lesson-text', locale, slug],
    queryFn: load,
    staleTime: Infinity,
    structuralSharing: false,
  });
