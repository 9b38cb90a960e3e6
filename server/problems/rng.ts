import { rational, type Rational } from '../../shared/quantity/rational.ts';

/** Seeded source of choices. Integer arithmetic only, so the same seed draws the same on every machine. */
export interface Rng {
  /** A whole number from least to most, both included. */
  int(least: number, most: number): number;
  /** One of least, least + step, ... up to most; exact. Arguments are decimal text or numbers, read exactly. */
  step(least: number | string, most: number | string, step: number | string): Rational;
  pick<T>(items: readonly T[]): T;
  /** A new array in random order (Fisher-Yates). */
  shuffle<T>(items: readonly T[]): T[];
  /** `count` different items. */
  sample<T>(items: readonly T[], count: number): T[];
  /** True in `of` of `outOf` cases. */
  chance(of: number, outOf: number): boolean;
}

/** FNV-1a, 32 bits, of a text's UTF-16 units. */
function hash(text: string, basis: number): number {
  let h = basis >>> 0;
  for (let i = 0; i < text.length; i += 1) {
    h ^= text.charCodeAt(i);
    h = Math.imul(h, 0x01000193) >>> 0;
  }
  return h;
}

/** The small fast counting generator sfc32 (C. Doty-Humphrey, PractRand), seeded from a text. */
function sfc32(seed: string): () => number {
  let a = hash(seed, 0x811c9dc5);
  let b = hash(seed, 0x9e3779b9);
  let c = hash(seed, 0x85ebca6b);
  let counter = 1;
  const next = () => {
    const t = (((a + b) | 0) + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (c << 21) | (c >>> 11);
    c = (c + t) | 0;
    return t >>> 0;
  };
  for (let i = 0; i < 12; i += 1) next();
  return next;
}

/** Makes a seeded source of choices from any text. */
export function makeRng(seed: string): Rng {
  const next = sfc32(seed);
  // Rejection keeps every value equally likely whatever the span.
  const below = (span: number): number => {
    const limit = 0x100000000 - (0x100000000 % span);
    let value = next();
    while (value >= limit) value = next();
    return value % span;
  };
  const int = (least: number, most: number): number => {
    if (!Number.isInteger(least) || !Number.isInteger(most) || most < least) {
      throw new RangeError(`int needs whole numbers in order, got ${least} and ${most}`);
    }
    return least + below(most - least + 1);
  };
  const shuffle = <T>(items: readonly T[]): T[] => {
    const out = [...items];
    for (let i = out.length - 1; i > 0; i -= 1) {
      const j = below(i + 1);
      [out[i], out[j]] = [out[j] as T, out[i] as T];
    }
    return out;
  };
  return {
    int,
    step(least, most, step) {
      const from = rational(least);
      const width = rational(step);
      const count = rational(most).sub(from).div(width).floor();
      return from.add(width.mul(int(0, Number(count.valueOf()))));
    },
    pick: (items) => {
      if (items.length === 0) throw new RangeError('pick needs at least one item');
      return items[below(items.length)] as (typeof items)[number];
    },
    shuffle,
    sample: (items, count) => {
      if (count > items.length) throw new RangeError(`sample of ${count} from ${items.length} items`);
      return shuffle(items).slice(0, count);
    },
    chance: (of, outOf) => below(outOf) < of,
  };
}
