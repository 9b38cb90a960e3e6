import { syllable } from 'syllable';
import { fleschKincaid } from 'flesch-kincaid';

/** A lesson's running text, block by block: no front matter, code, tags, sums of their own or headings. */
export function proseOf(mdx: string): string[] {
  return mdx
    .replace(/^---\n[\s\S]*?\n---\n/, '')
    .replaceAll(/^import .*$/gm, '')
    .replaceAll(/^export const [\s\S]*?;$/gm, '')
    .replaceAll(/\{\/\*[\s\S]*?\*\/\}/g, '')
    .replaceAll(/^\$\$\n[\s\S]*?\n\$\$$/gm, '')
    .replaceAll(/(?<!\\)\$[^$\n]+\$/g, 'sum')
    .replaceAll(/<[^<>]*?>/g, '')
    .replaceAll(/^#+ .*$/gm, '')
    .split(/\n\s*\n|\n(?=\s*(?:-|\d+\.) )/)
    .map((block) =>
      block
        .replace(/^\s*(?:-|\d+\.) /, '')
        .replaceAll(/[*_`]/g, '')
        .replaceAll(/\s+/g, ' ')
        .trim(),
    )
    .filter((block) => block.length > 0);
}

/** Sentences of the prose; what ends a block ends a sentence. */
export function sentencesOf(prose: readonly string[]): string[] {
  return prose.flatMap((block) => block.split(/(?<=[.?!][”"’)]*)\s+/)).filter((sentence) => /\w/.test(sentence));
}

/** Words: whatever has a letter or a digit in it. */
export function wordsOf(text: string): string[] {
  return text.split(/\s+/).filter((word) => /[\p{L}\d]/u.test(word));
}

/** United States school grade by Flesch and Kincaid (1975), from counted sentences, words and syllables. */
export function gradeOf(prose: readonly string[]): number {
  const sentences = sentencesOf(prose);
  const words = sentences.flatMap(wordsOf);
  return fleschKincaid({ sentence: sentences.length, word: words.length, syllable: syllable(words.join(' ')) });
}

const numbersOnly = (tex: string): string =>
  tex
    .replaceAll('{,}', '')
    .replaceAll(/\\(?:cancel|mathbf|boldsymbol)\{((?:[^{}]|\{[^{}]*\})*)\}/g, '$1')
    .replaceAll(/\\text(?:bf)?\{[^{}]*\}/g, ' ')
    .replaceAll(/\\d?frac\{((?:[^{}]|\{[^{}]*\})*)\}\{((?:[^{}]|\{[^{}]*\})*)\}/g, '(($1)/($2))')
    .replaceAll(String.raw`\times`, '*')
    .replaceAll(String.raw`\div`, '/')
    .replaceAll(/\\[a-z]+|\\.|[a-z%]/gi, ' ')
    .replaceAll('−', '-')
    // A unit that stood alone as a factor leaves its sign behind.
    .replaceAll(/\*\s*(?=[)*]|$)/g, '')
    .trim();

/** Both sides of every equation of a lesson, units left out, as arithmetic to be worked. */
export function equationsOf(mdx: string): { left: string; right: string }[] {
  const sums = [...mdx.matchAll(/^\$\$\n([\s\S]*?)\n\$\$$|(?<!\\)\$([^$\n]+)\$/gm)].map(
    ([, block, line]) => block ?? line,
  );
  return sums
    .flatMap((sum) => (sum ?? '').split(/\\qquad|\\\\|\\quad/))
    .flatMap((equation) => {
      const sides = equation.split(/=|\\approx/).map(numbersOnly);
      return sides.slice(1).map((right, index) => ({ left: sides[index] ?? '', right }));
    })
    .filter(({ left, right }) => /\d/.test(left) && /\d/.test(right));
}
