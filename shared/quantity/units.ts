import { rational, type Rational } from './rational.ts';

/** What a unit measures. */
export const kinds = [
  'length',
  'area',
  'volume',
  'weight',
  'flow',
  'speed',
  'pressure',
  'volume-per-area',
  'weight-per-area',
  'volume-per-volume',
  'weight-per-volume',
  'percent',
  'parts',
  'temperature',
  'time',
  'money',
  'money-per-area',
  'area-per-time',
  'angle',
  'count',
] as const;
export type Kind = (typeof kinds)[number];

// Sources of the factors, each exact. The factors of rates follow from those of their parts.
const institute = 'National Institute of Standards and Technology';
const handbook = `Handbook 44, Appendix C: General Tables of Units of Measurement, ${institute}, 2012`;
const guide = `Guide for the Use of the International System of Units, Special Publication 811, Appendix B.8, ${institute}, 2008`;
const inch = `1 in = 25.4 mm: ${guide}`;
const force = `1 lb = 0.45359237 kg, standard gravity 9.80665 m/s², 1 in = 0.0254 m: ${guide}`;
const si = `The International System of Units, Special Publication 330, ${institute}, 2019`;
const defined = 'by definition';

/** A product and quotient of decimals, exact: "0.3048/60", "60*29.5735295625". */
function factor(expression: string): Rational {
  return expression
    .split('/')
    .map((product) =>
      product
        .split('*')
        .map((text) => rational(text))
        .reduce((a, b) => a.mul(b)),
    )
    .reduce((a, b) => a.div(b));
}

type Row = readonly [kind: Kind, toBase: string, source: string, offset?: string];

// Bases: m, m², mL, g, mL/min, m/s, Pa, mL/m², g/m², mL/mL, g/mL, %, ppm, °C, s, $, $/m², m²/s, degree, one.
const rows = {
  in: ['length', '0.0254', inch],
  ft: ['length', '0.3048', inch],
  yd: ['length', '0.9144', inch],
  mi: ['length', '1609.344', inch],
  mm: ['length', '0.001', si],
  cm: ['length', '0.01', si],
  m: ['length', '1', si],
  km: ['length', '1000', si],
  'sq-in': ['area', '0.00064516', handbook],
  'sq-ft': ['area', '0.09290304', handbook],
  'sq-yd': ['area', '0.83612736', handbook],
  '1000-sq-ft': ['area', '92.90304', handbook],
  acre: ['area', '4046.8564224', handbook],
  'sq-m': ['area', '1', si],
  ha: ['area', '10000', si],
  'sq-mi': ['area', '2589988.110336', handbook],
  tsp: ['volume', '4.92892159375', handbook],
  tbsp: ['volume', '14.78676478125', handbook],
  'fl-oz': ['volume', '29.5735295625', handbook],
  cup: ['volume', '236.5882365', handbook],
  pt: ['volume', '473.176473', handbook],
  qt: ['volume', '946.352946', handbook],
  gal: ['volume', '3785.411784', handbook],
  ml: ['volume', '1', si],
  l: ['volume', '1000', si],
  'cu-in': ['volume', '16.387064', handbook],
  'cu-ft': ['volume', '28316.846592', handbook],
  oz: ['weight', '28.349523125', handbook],
  lb: ['weight', '453.59237', handbook],
  g: ['weight', '1', si],
  kg: ['weight', '1000', si],
  ton: ['weight', '907184.74', handbook],
  'gal/min': ['flow', '3785.411784', handbook],
  'fl-oz/min': ['flow', '29.5735295625', handbook],
  'l/min': ['flow', '1000', si],
  'ml/min': ['flow', '1', si],
  'fl-oz/s': ['flow', '60*29.5735295625', handbook],
  mph: ['speed', '0.44704', inch],
  'ft/min': ['speed', '0.3048/60', inch],
  'ft/s': ['speed', '0.3048', inch],
  'km/h': ['speed', '1000/3600', si],
  'm/s': ['speed', '1', si],
  psi: ['pressure', '0.45359237*9.80665/0.00064516', force],
  kpa: ['pressure', '1000', si],
  bar: ['pressure', '100000', guide],
  'gal/acre': ['volume-per-area', '3785.411784/4046.8564224', handbook],
  'qt/acre': ['volume-per-area', '946.352946/4046.8564224', handbook],
  'pt/acre': ['volume-per-area', '473.176473/4046.8564224', handbook],
  'fl-oz/acre': ['volume-per-area', '29.5735295625/4046.8564224', handbook],
  'gal/1000-sq-ft': ['volume-per-area', '3785.411784/92.90304', handbook],
  'qt/1000-sq-ft': ['volume-per-area', '946.352946/92.90304', handbook],
  'pt/1000-sq-ft': ['volume-per-area', '473.176473/92.90304', handbook],
  'fl-oz/1000-sq-ft': ['volume-per-area', '29.5735295625/92.90304', handbook],
  'tbsp/1000-sq-ft': ['volume-per-area', '14.78676478125/92.90304', handbook],
  'tsp/1000-sq-ft': ['volume-per-area', '4.92892159375/92.90304', handbook],
  'ml/1000-sq-ft': ['volume-per-area', '1/92.90304', handbook],
  'l/ha': ['volume-per-area', '1000/10000', si],
  'lb/acre': ['weight-per-area', '453.59237/4046.8564224', handbook],
  'oz/acre': ['weight-per-area', '28.349523125/4046.8564224', handbook],
  'lb/1000-sq-ft': ['weight-per-area', '453.59237/92.90304', handbook],
  'oz/1000-sq-ft': ['weight-per-area', '28.349523125/92.90304', handbook],
  'g/1000-sq-ft': ['weight-per-area', '1/92.90304', handbook],
  'g/sq-m': ['weight-per-area', '1', si],
  'kg/ha': ['weight-per-area', '1000/10000', si],
  'fl-oz/gal': ['volume-per-volume', '29.5735295625/3785.411784', handbook],
  'tbsp/gal': ['volume-per-volume', '14.78676478125/3785.411784', handbook],
  'tsp/gal': ['volume-per-volume', '4.92892159375/3785.411784', handbook],
  'ml/gal': ['volume-per-volume', '1/3785.411784', handbook],
  'ml/l': ['volume-per-volume', '1/1000', si],
  'fl-oz/100-gal': ['volume-per-volume', '29.5735295625/3785.411784/100', handbook],
  'pt/100-gal': ['volume-per-volume', '473.176473/3785.411784/100', handbook],
  'qt/100-gal': ['volume-per-volume', '946.352946/3785.411784/100', handbook],
  'gal/100-gal': ['volume-per-volume', '3785.411784/3785.411784/100', handbook],
  'lb/gal': ['weight-per-volume', '453.59237/3785.411784', handbook],
  'oz/gal': ['weight-per-volume', '28.349523125/3785.411784', handbook],
  'g/gal': ['weight-per-volume', '1/3785.411784', handbook],
  'g/l': ['weight-per-volume', '1/1000', si],
  'lb/100-gal': ['weight-per-volume', '453.59237/3785.411784/100', handbook],
  'oz/100-gal': ['weight-per-volume', '28.349523125/3785.411784/100', handbook],
  percent: ['percent', '1', defined],
  ppm: ['parts', '1', defined],
  f: ['temperature', '5/9', guide, '-160/9'],
  c: ['temperature', '1', si],
  s: ['time', '1', defined],
  min: ['time', '60', defined],
  h: ['time', '3600', defined],
  day: ['time', '86400', defined],
  usd: ['money', '1', defined],
  'usd/acre': ['money-per-area', '1/4046.8564224', handbook],
  'usd/1000-sq-ft': ['money-per-area', '1/92.90304', handbook],
  'acre/h': ['area-per-time', '4046.8564224/3600', handbook],
  '1000-sq-ft/h': ['area-per-time', '92.90304/3600', handbook],
  deg: ['angle', '1', defined],
  count: ['count', '1', defined],
} as const satisfies Record<string, Row>;

export type UnitKey = keyof typeof rows;

/** One unit: what it measures and its exact factor. */
export interface Unit {
  readonly key: UnitKey;
  readonly kind: Kind;
  /** Exact factor to the base unit of its kind. */
  readonly toBase: Rational;
  /** Added after the factor; degrees only. */
  readonly offset?: Rational;
  readonly source: string;
}

const entries = (Object.entries(rows) as [UnitKey, Row][]).map(([key, [kind, toBase, source, offset]]) => {
  const unit: Unit = { key, kind, toBase: factor(toBase), source };
  return [key, offset === undefined ? unit : { ...unit, offset: factor(offset) }] as const;
});

/** Every unit by key. */
export const units: Readonly<Record<UnitKey, Unit>> = Object.fromEntries(entries) as Record<UnitKey, Unit>;

const byKind = new Map<Kind, readonly UnitKey[]>(
  kinds.map((kind) => [kind, entries.filter(([, unit]) => unit.kind === kind).map(([key]) => key)]),
);

/** The units of one kind, in the order of the table. */
export function unitsOfKind(kind: Kind): readonly UnitKey[] {
  return byKind.get(kind) ?? [];
}
/** What a unit measures. */
export function kindOf(unit: UnitKey): Kind {
  return units[unit].kind;
}
