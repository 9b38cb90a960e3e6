import katex from 'katex';
import type { WorkingLineView } from '../../../shared/contracts/practice.ts';
import type { Locale } from '../../../shared/vocabulary.ts';
import type { Problem } from '../../problems/engine.ts';
import { texText, toPlain, toTex, type WorkingLine } from '../../problems/working.ts';

function tex(line: WorkingLine, locale: Locale): string {
  const chain = [texText(line.name[locale])];
  if (line.expression) chain.push(toTex(line.expression, locale));
  if (line.result) {
    const value = toTex(line.result, locale);
    chain.push(line.answers ? `\\boldsymbol{${value}}` : value);
  }
  return chain.join(' = ');
}

function view(line: WorkingLine, locale: Locale): WorkingLineView {
  const parts = [line.name[locale]];
  if (line.expression) parts.push(toPlain(line.expression, locale));
  if (line.result) parts.push(toPlain(line.result, locale));
  const html =
    line.expression || line.result
      ? katex.renderToString(tex(line, locale), { strict: 'error', throwOnError: true, output: 'htmlAndMathml' })
      : '';
  return { html, plain: parts.join(' = '), reason: line.reason[locale], answers: line.answers ?? false };
}

/** The worked solution with formulas already rendered, so that no formula engine goes to the browser. */
export function workingView(problem: Problem, locale: Locale): WorkingLineView[] {
  return problem.family.working(problem.given).map((line) => view(line, locale));
}
