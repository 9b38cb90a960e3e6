import { formatNumber, formatQuantity, unitSymbol } from '../../shared/quantity/format.ts';
import type { Quantity } from '../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../shared/quantity/rational.ts';
import type { Locale, Text } from '../../shared/vocabulary.ts';

/** An expression of a worked solution. Written once, rendered as KaTeX source, as plain text, in either language. */
export type Expression =
  | {
      readonly is: 'quantity';
      readonly value: Quantity;
      readonly cancel: boolean;
      readonly maxPlaces: number;
      readonly places?: number;
    }
  | { readonly is: 'number'; readonly value: Rational; readonly maxPlaces: number }
  | { readonly is: 'joined'; readonly sign: '×' | '+' | '−' | '÷' | '=' | '≈'; readonly items: readonly Expression[] }
  | { readonly is: 'over'; readonly top: Expression; readonly bottom: Expression }
  | { readonly is: 'grouped'; readonly item: Expression }
  | { readonly is: 'root'; readonly item: Expression }
  | { readonly is: 'squared'; readonly item: Expression };

/** One line of a worked solution: name = expression = value, with a short reason. */
export interface WorkingLine {
  /** What the line finds: "area sprayed". */
  readonly name: Text;
  /** Left out where the line is a plain statement ("check: is it sensible?"). */
  readonly expression?: Expression;
  /** The line's value as one would write it; printed bold on a part's last line. */
  readonly result?: Expression;
  /** True on the line that gives a part's answer. */
  readonly answers?: boolean;
  /** A short reason or remark in words. */
  readonly reason: Text;
}

/** A quantity with its unit; `cancel` strikes the unit through. `maxPlaces` bounds the decimals shown (default 4); `places` fixes them. */
export function given(
  value: Quantity,
  options: { cancel?: boolean; maxPlaces?: number; places?: number } = {},
): Expression {
  const base = { is: 'quantity', value, cancel: options.cancel ?? false, maxPlaces: options.maxPlaces ?? 4 } as const;
  return options.places === undefined ? base : { ...base, places: options.places };
}
/** The same as `given`, with the unit struck through. */
export function struck(value: Quantity, maxPlaces = 4): Expression {
  return { is: 'quantity', value, cancel: true, maxPlaces };
}
/** A bare number. */
export function number(value: Rational | number | string, maxPlaces = 6): Expression {
  return { is: 'number', value: rational(value), maxPlaces };
}
/** A product. */
export function times(...items: Expression[]): Expression {
  return { is: 'joined', sign: '×', items };
}
/** A sum. */
export function plus(...items: Expression[]): Expression {
  return { is: 'joined', sign: '+', items };
}
/** A difference. */
export function minus(...items: Expression[]): Expression {
  return { is: 'joined', sign: '−', items };
}
/** A quotient on one line. */
export function dividedBy(...items: Expression[]): Expression {
  return { is: 'joined', sign: '÷', items };
}
/** Equal after rounding: 100.48 sq ft ≈ 100 sq ft. */
export function about(exact: Expression, rounded: Expression): Expression {
  return { is: 'joined', sign: '≈', items: [exact, rounded] };
}
/** A quotient as a fraction. */
export function over(top: Expression, bottom: Expression): Expression {
  return { is: 'over', top, bottom };
}
/** In parentheses. */
export function grouped(item: Expression): Expression {
  return { is: 'grouped', item };
}
/** A square root: the law of pressure and flow. @public */
export function root(item: Expression): Expression {
  return { is: 'root', item };
}
/** A square: the same law turned round. @public */
export function squared(item: Expression): Expression {
  return { is: 'squared', item };
}

const texSigns = { '×': ' \\times ', '+': ' + ', '−': ' - ', '÷': ' \\div ', '=': ' = ', '≈': ' \\approx ' } as const;

/** Plain words as KaTeX source: signs that it reads as commands are escaped, raised figures set as powers. */
export function texText(text: string): string {
  const escaped = text.replace(/[\\{}$&#^_~%]/g, (sign) => (sign === '\\' ? '\\textbackslash ' : `\\${sign}`));
  // Raised figures are no letters of KaTeX's text mode: "pies²".
  return `\\text{${escaped.replaceAll('²', '}^{2}\\text{').replaceAll('³', '}^{3}\\text{')}}`.replaceAll(
    '\\text{}',
    '',
  );
}
function texNumber(text: string): string {
  return text.replaceAll(',', '{,}').replaceAll('−', '-').replaceAll('$', '\\$').replaceAll('%', '\\%');
}
function texQuantity(item: Extract<Expression, { is: 'quantity' }>, locale: Locale): string {
  const { value, cancel, maxPlaces, places } = item;
  if (value.unit === 'usd' || value.unit === 'percent')
    return texNumber(formatQuantity(value, { maxPlaces, places, locale }));
  const digits = texNumber(formatNumber(value.value, { maxPlaces, places, locale }));
  const symbol = unitSymbol(value.unit, { locale, value: value.value });
  if (symbol === '') return digits;
  const unit = texText(symbol);
  return `${digits}\\,${cancel ? `\\cancel{${unit}}` : unit}`;
}

/** The expression as KaTeX source. */
export function toTex(item: Expression, locale: Locale): string {
  switch (item.is) {
    case 'quantity':
      return texQuantity(item, locale);
    case 'number':
      return texNumber(formatNumber(item.value, { maxPlaces: item.maxPlaces, locale }));
    case 'joined':
      return item.items.map((one) => toTex(one, locale)).join(texSigns[item.sign]);
    case 'over':
      return `\\frac{${toTex(item.top, locale)}}{${toTex(item.bottom, locale)}}`;
    case 'grouped':
      return `\\left(${toTex(item.item, locale)}\\right)`;
    case 'root':
      return `\\sqrt{${toTex(item.item, locale)}}`;
    case 'squared':
      return `{${toTex(item.item, locale)}}^{2}`;
  }
}

function plainOperand(item: Expression, locale: Locale): string {
  const text = toPlain(item, locale);
  return item.is === 'joined' ? `(${text})` : text;
}

/** The expression as plain text: "1,600 sq ft × 1.5 fl oz / 1,000 sq ft". */
export function toPlain(item: Expression, locale: Locale): string {
  switch (item.is) {
    case 'quantity':
      return formatQuantity(item.value, { maxPlaces: item.maxPlaces, places: item.places, locale });
    case 'number':
      return formatNumber(item.value, { maxPlaces: item.maxPlaces, locale });
    case 'joined':
      return item.items.map((one) => toPlain(one, locale)).join(` ${item.sign} `);
    case 'over':
      return `${plainOperand(item.top, locale)} / ${plainOperand(item.bottom, locale)}`;
    case 'grouped':
      return `(${toPlain(item.item, locale)})`;
    case 'root':
      return `√(${toPlain(item.item, locale)})`;
    case 'squared':
      return `(${toPlain(item.item, locale)})²`;
  }
}

/** A whole line as plain text: "area sprayed = 1,800 sq ft − 200 sq ft = 1,600 sq ft. Reason." */
export function lineToPlain(line: WorkingLine, locale: Locale): string {
  const chain = [line.name[locale]];
  if (line.expression) chain.push(toPlain(line.expression, locale));
  if (line.result) chain.push(toPlain(line.result, locale));
  const sum = line.expression || line.result ? chain.join(' = ') : chain.join('');
  const reason = line.reason[locale];
  return reason ? `${sum}. ${reason}` : `${sum}.`;
}
