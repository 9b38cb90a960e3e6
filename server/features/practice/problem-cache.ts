import { randomBytes } from 'node:crypto';
import { AppError } from '../../../shared/errors.ts';
import type { Tier, Topic } from '../../../shared/vocabulary.ts';
import { generate, type Problem } from '../../problems/engine.ts';
import { familyVersion } from '../../problems/registry.ts';

/** Problems kept at hand between showing and answering; the oldest gives way. */
const mostKept = 5_000;

/** 80 random bits as text: nobody guesses a seed, and no two problems meet. */
export function randomSeed(): string {
  return randomBytes(10).toString('hex');
}

/** Generates problems from what is stored of them, keeping the recent ones. */
export function problemCache() {
  const kept = new Map<string, Problem>();
  const topics = new Map<string, readonly Topic[]>();
  return {
    /** @throws AppError `not-found` when the family is no longer known in that version */
    get(key: { family: string; version: number; seed: string; tier: Tier }): Problem {
      const name = `${key.family}@${key.version}/${key.tier}/${key.seed}`;
      const known = kept.get(name);
      if (known) return known;
      const family = familyVersion(key.family, key.version);
      if (!family) throw new AppError('not-found');
      const made = generate(family, { seed: key.seed, tier: key.tier });
      kept.set(name, made);
      if (kept.size > mostKept) kept.delete(kept.keys().next().value as string);
      return made;
    },

    /** Notes which topics a shown problem exercises: reading for its answer then needs those levels only. */
    remember(id: string, { parts }: Problem): void {
      if (topics.has(id)) return;
      topics.set(id, [...new Set(parts.map((part) => part.topic))]);
      if (topics.size > mostKept) topics.delete(topics.keys().next().value as string);
    },

    /** The topics of a problem shown not long ago; null when it is not remembered. */
    topicsOf: (id: string): readonly Topic[] | null => topics.get(id) ?? null,
  };
}
