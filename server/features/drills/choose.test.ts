import { describe, expect, test } from 'vitest';
import { families } from '../../problems/registry.ts';
import { chooseProblem, tierAt } from './choose.ts';

function run(topics: Parameters<typeof chooseProblem>[0]['topics'], tier: 1 | 2 | 3 | 'rising', length: number) {
  const before: string[] = [];
  const chosen = [];
  for (let position = 1; position <= length; position += 1) {
    const choice = chooseProblem({ drillId: 'drill-1', topics, tier, length, position, before });
    if (!choice) throw new Error('nothing chosen');
    before.push(choice.family);
    chosen.push(choice);
  }
  return chosen;
}
const topicOf = (key: string) => families.find((family) => family.key === key)?.topic;

describe('what a drill asks next', () => {
  test('rising goes from tier 1 by thirds to tier 3', () => {
    expect(Array.from({ length: 10 }, (_, index) => tierAt('rising', index + 1, 10))).toEqual([
      1, 1, 1, 1, 2, 2, 2, 3, 3, 3,
    ]);
  });
  test('topics take turns', () => {
    const topics = run(['area', 'rate'], 2, 10).map((choice) => topicOf(choice.family));
    topics.slice(1).forEach((topic, index) => expect(topic).not.toBe(topics[index]));
    expect(new Set(topics)).toEqual(new Set(['area', 'rate']));
  });
  test('within a topic every family comes before one comes again, never the same twice running', () => {
    const keys = run(['area'], 1, 10).map((choice) => choice.family);
    const area = families.filter((family) => family.topic === 'area' && family.tiers.includes(1));
    expect(new Set(keys.slice(0, area.length)).size).toBe(area.length);
    keys.slice(1).forEach((key, index) => expect(key).not.toBe(keys[index]));
  });
  test('a family is only asked in a tier it has', () => {
    for (const choice of run(['area', 'rate', 'units'], 'rising', 20)) {
      expect(families.find((family) => family.key === choice.family)?.tiers).toContain(choice.tier);
    }
  });
  test('topics without problems give nothing', () => {
    const options = { drillId: 'd', topics: ['law'] as const, tier: 1 as const, length: 5, position: 1, before: [] };
    expect(chooseProblem(options)).toBeNull();
  });
});
