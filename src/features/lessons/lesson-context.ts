import { createContext, useContext, type ReactNode } from 'react';
import type { Tier } from '../../../shared/vocabulary.ts';

export interface CheckpointPlace {
  id: string;
  family: string;
  tier: Tier;
}

interface LessonContextValue {
  slug: string;
  /** Names of its checkpoints, in the order of the text. */
  checkpoints: readonly string[];
  /** Draws the problem of a checkpoint; given by the page, since problems are another feature's. */
  renderCheckpoint: (place: CheckpointPlace) => ReactNode;
}

const LessonContext = createContext<LessonContextValue | null>(null);
export const LessonProvider = LessonContext.Provider;

export function useLesson(): LessonContextValue {
  const lesson = useContext(LessonContext);
  if (!lesson) throw new Error('This part of a lesson stands outside a lesson.');
  return lesson;
}
