import type { LevelView } from '../../../shared/contracts/practice.ts';
import type { Topic } from '../../../shared/vocabulary.ts';

export interface Suggestion {
  topics: Topic[];
  /** Why these: nothing of them was worked yet, or they are the lowest. */
  why: 'new' | 'low';
}

/** Two topics to drill now: the lowest of those begun, topped up with new ones in the order of the course. */
export function suggestDrill(levels: readonly LevelView[]): Suggestion | null {
  const drillable = levels.filter((level) => level.tiers.length > 0);
  const low = drillable
    .filter((level) => level.state === 'filling' || level.state === 'top-up')
    .sort((a, b) => (a.fill ?? 0) - (b.fill ?? 0));
  // The arithmetic of measuring comes first for somebody new: everything else stands on it.
  const first = new Set<Topic>(['area', 'units', 'rate']);
  const fresh = drillable
    .filter((level) => level.state === 'not-started')
    .sort((a, b) => Number(first.has(b.topic)) - Number(first.has(a.topic)));
  const chosen = low.length >= 2 ? low.slice(0, 2) : [...low, ...fresh].slice(0, 2);
  if (chosen.length === 0) return drillable[0] ? { topics: [drillable[0].topic], why: 'low' } : null;
  return { topics: chosen.map((level) => level.topic), why: low.length === 0 ? 'new' : 'low' };
}
