import { parseArgs } from 'node:util';
import { describe } from '../server/problems/describe.ts';
import { generate, type Problem } from '../server/problems/engine.ts';
import type { Family } from '../server/problems/family.ts';
import { gradePart, isUnreadable, type Response } from '../server/problems/grade.ts';
import { families, familyByKey } from '../server/problems/registry.ts';
import { unreadableMessages } from '../server/problems/verdict-messages.ts';
import type { Quantity } from '../shared/quantity/quantity.ts';
import { locales, partKeys, tiers, type Locale, type PartKey, type Tier } from '../shared/vocabulary.ts';

// Prints generated problems with answers, slips and worked solutions: for authors and checkers.

const usage = `usage:
  npm run -s problems -- --list                                the families, one a line: key topic tiers
  npm run -s problems -- --family KEY|all [--tier N] [--seed S] [--count N] [--locale en|es] [--json]
  npm run -s problems -- --family KEY --tier N --seed S --grade "b=2.7 fl oz" [--grade ...]
Without --tier every tier is printed. With --count above 1 the seeds are S, S-2, S-3 ...`;

class UsageError extends Error {}

interface Options {
  families: readonly Family<unknown>[];
  tier: Tier | null;
  seed: string;
  count: number;
  locale: Locale;
  json: boolean;
  grades: readonly string[];
}

function readTier(text: string | undefined): Tier | null {
  if (text === undefined) return null;
  const tier = tiers.find((one) => String(one) === text);
  if (!tier) throw new UsageError(`--tier must be 1, 2 or 3, got "${text}"`);
  return tier;
}

function readFamilies(text: string | undefined): readonly Family<unknown>[] {
  if (text === undefined) throw new UsageError('--family is missing');
  if (text === 'all') return families;
  const family = familyByKey(text);
  if (!family) throw new UsageError(`there is no family "${text}"; --list shows them`);
  return [family];
}

function readOptions(): Options | 'list' | 'help' {
  const { values } = parseArgs({
    options: {
      family: { type: 'string' },
      tier: { type: 'string' },
      seed: { type: 'string', default: '1' },
      count: { type: 'string', default: '1' },
      locale: { type: 'string', default: 'en' },
      json: { type: 'boolean', default: false },
      list: { type: 'boolean', default: false },
      help: { type: 'boolean', default: false },
      grade: { type: 'string', multiple: true, default: [] },
    },
  });
  if (values.help) return 'help';
  if (values.list) return 'list';
  const count = Number(values.count);
  if (!Number.isInteger(count) || count < 1 || count > 1_000_000) {
    throw new UsageError(`--count must be a whole number from 1 to 1,000,000, got "${values.count}"`);
  }
  const locale = locales.find((one) => one === values.locale);
  if (!locale) throw new UsageError(`--locale must be en or es, got "${values.locale}"`);
  const tier = readTier(values.tier);
  const chosen = readFamilies(values.family);
  const only = chosen.length === 1 ? chosen[0] : undefined;
  if (tier && only && !only.tiers.includes(tier)) {
    throw new UsageError(`family ${only.key} has tiers ${only.tiers.join(', ')}, not ${tier}`);
  }
  return { families: chosen, tier, seed: values.seed, count, locale, json: values.json, grades: values.grade };
}

function responseFor(problem: Problem, part: PartKey, text: string): Response {
  const kind = problem.parts.find((one) => one.key === part)?.kind;
  if (kind === 'choice') return { kind: 'choice', option: text };
  if (kind === 'order') return { kind: 'order', steps: text.split(/[\s,>]+/).filter(Boolean) };
  return { kind: 'number', text };
}

/** Grades "a=..." entries in the order given; a part's first readable value carries into later parts. */
function grade(problem: Problem, options: Options): void {
  const { locale } = options;
  const earlier: Partial<Record<PartKey, Quantity>> = {};
  for (const entry of options.grades) {
    const cut = entry.indexOf('=');
    const key = partKeys.find((one) => one === entry.slice(0, cut).trim());
    if (cut < 1 || !key || !problem.parts.some((part) => part.key === key)) {
      throw new UsageError(`--grade "${entry}" must be PART=ANSWER with a part of ${problem.key.family}`);
    }
    const typed = entry.slice(cut + 1).trim();
    const response = responseFor(problem, key, typed);
    const result = gradePart({ problem, part: key, response, earlier, locale });
    if (isUnreadable(result)) {
      const message = unreadableMessages[result.unreadable][locale];
      console.log(JSON.stringify({ part: key, typed, verdict: 'unreadable', code: result.unreadable, message }));
      continue;
    }
    if (result.value && earlier[key] === undefined) earlier[key] = result.value;
    const { verdict, slip, read, message } = result;
    const said = { headline: message.headline[locale], detail: message.detail[locale] };
    console.log(JSON.stringify({ part: key, typed, read: read[locale], verdict, slip, ...said }));
  }
}

function answerLine(answer: ReturnType<typeof describe>['parts'][number]['answer']): string {
  if (typeof answer === 'string') return answer;
  return Array.isArray(answer) ? answer.join(' > ') : `${answer.decimal} ${answer.unit}`;
}

function printText(problem: Problem, locale: Locale): void {
  const one = describe(problem, locale);
  const lines = [`== ${one.family} v${one.version} tier ${one.tier} seed ${one.seed}: ${one.heading}`, one.statement];
  if (one.label) {
    lines.push(`[${one.label.name}] ${one.label.rows.map((row) => `${row.heading}: ${row.text}`).join(' | ')}`);
  }
  for (const part of one.parts) {
    lines.push(`(${part.key}) ${part.ask}  => ${answerLine(part.answer)}`);
    for (const option of part.options) {
      const why = [option.slip, option.reason].filter(Boolean).join(' ');
      lines.push(`    ${option.right ? '*' : '-'} ${option.text}  ${why}`.trimEnd());
    }
  }
  for (const slip of one.slips) {
    lines.push(`  slip ${slip.part} ${slip.key} = ${slip.answer.decimal} ${slip.answer.unit}: ${slip.message}`);
  }
  lines.push(...one.hints.map((hint, index) => `  hint ${index + 1}: ${hint}`));
  lines.push(...one.solution.map((line) => `  > ${line}`));
  console.log(`${lines.join('\n')}\n`);
}

function run(options: Options): void {
  for (const family of options.families) {
    for (const tier of family.tiers) {
      if (options.tier && tier !== options.tier) continue;
      for (let number = 1; number <= options.count; number += 1) {
        const problem = generate(family, { seed: number === 1 ? options.seed : `${options.seed}-${number}`, tier });
        if (options.grades.length > 0) grade(problem, options);
        else if (options.json) console.log(JSON.stringify(describe(problem, options.locale)));
        else printText(problem, options.locale);
      }
    }
  }
}

try {
  const options = readOptions();
  if (options === 'help') console.log(usage);
  else if (options === 'list') {
    for (const { key, topic, tiers: has } of families) console.log(`${key} ${topic} ${has.join(',')}`);
  } else run(options);
} catch (error) {
  if (!(error instanceof UsageError) && !(error instanceof TypeError && 'code' in error)) throw error;
  console.error(`${error.message}\n${usage}`);
  process.exitCode = 2;
}
