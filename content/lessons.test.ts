import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { lessonFrontSchema } from '../shared/contracts/lessons.ts';
import { families } from '../server/problems/registry.ts';
import { equationsOf, gradeOf, proseOf, sentencesOf, wordsOf } from '../tests/support/lesson-text.ts';

const folder = fileURLToPath(new URL('lessons/en', import.meta.url));
const lessons = readdirSync(folder, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.mdx'))
  .sort()
  .map((name) => {
    const mdx = readFileSync(`${folder}/${name}`, 'utf8');
    const front: unknown = parse(/^---\n([\s\S]*?)\n---/.exec(mdx)?.[1] ?? '');
    return { name, mdx, front, prose: proseOf(mdx) };
  });

const attribute = (tag: string, name: string) => new RegExp(`\\b${name}=(?:"([^"]*)"|\\{([^}]*)\\})`).exec(tag);
function checkpointsOf(mdx: string) {
  return (mdx.match(/<Checkpoint\b[^>]*\/>/g) ?? []).map((tag) => ({
    id: attribute(tag, 'id')?.[1] ?? '',
    family: attribute(tag, 'family')?.[1] ?? '',
    tier: Number(attribute(tag, 'tier')?.[2]),
  }));
}

describe.each(lessons)('lesson $name', ({ name, mdx, front, prose }) => {
  it('has front matter of the schema, in the folder of its topic', () => {
    const read = lessonFrontSchema.parse(front);
    expect(name.startsWith(`${read.topic}/`)).toBe(true);
    expect(read.minutes).toBeGreaterThanOrEqual(5);
    expect(read.minutes).toBeLessThanOrEqual(9);
    for (const key of read.families) expect(families.map((family) => family.key)).toContain(key);
  });

  it('has 600 to 1,000 words at a reading grade of at most 8', () => {
    const words = prose.flatMap(wordsOf).length;
    expect(words).toBeGreaterThanOrEqual(600);
    expect(words).toBeLessThanOrEqual(1000);
    expect(gradeOf(prose)).toBeLessThanOrEqual(8);
  });

  it('asks two to four checkpoints, each of a family and tier that exist and that it prepares for', () => {
    const checkpoints = checkpointsOf(mdx);
    expect(checkpoints.length).toBeGreaterThanOrEqual(2);
    expect(checkpoints.length).toBeLessThanOrEqual(4);
    expect(new Set(checkpoints.map(({ id }) => id)).size).toBe(checkpoints.length);
    const prepared = lessonFrontSchema.parse(front).families;
    for (const { id, family, tier } of checkpoints) {
      expect(id).toMatch(/^[a-z0-9-]+$/);
      expect(prepared).toContain(family);
      expect(families.find(({ key }) => key === family)?.tiers).toContain(tier);
    }
  });

  it('has a drawing, a worked example, a caution, and ends at the tank', () => {
    expect(mdx).toMatch(/<Figure\b/);
    expect(mdx).toMatch(/<WorkedExample>/);
    expect(mdx).toMatch(/<Caution>/);
    expect(mdx.trimEnd().endsWith('</AtTheTank>')).toBe(true);
  });

  it('has sums that come out and stand as MDX reads them', () => {
    // A formula on one line with its double dollars is set inside the line, not as a line of its own.
    expect(mdx).not.toMatch(/^\$\$.+\$\$$/m);
    const equations = equationsOf(mdx);
    expect(equations.length).toBeGreaterThan(1);
    for (const { left, right } of equations) {
      const worked = Number(evaluate(left));
      const printed = Number(evaluate(right));
      expect(Math.abs(worked - printed) / printed, `${left} = ${right}`).toBeLessThan(0.011);
    }
  });

  it('is calm in tone', () => {
    const text = prose.join('\n');
    expect(text).not.toMatch(/!/);
    expect(text).not.toMatch(/\b(?:simply|just|obviously|easy)\b/i);
  });
});

it('says nothing twice in two lessons', () => {
  const seen = new Map<string, string>();
  for (const { name, prose } of lessons) {
    for (const sentence of sentencesOf(prose).filter((one) => wordsOf(one).length > 5)) {
      expect(seen.get(sentence) ?? name, sentence).toBe(name);
      seen.set(sentence, name);
    }
  }
});
