import { rational, type Rational } from './rational.ts';
import { units, type Unit, type UnitKey } from './units.ts';

/** An exact value with its unit. */
export interface Quantity {
  readonly value: Rational;
  readonly unit: UnitKey;
}

/** An exact quantity; numbers and text are read as `rational` reads them. */
export function quantity(value: number | string | bigint | Rational, unit: UnitKey): Quantity {
  return { value: rational(value), unit };
}

const factors = new Map<UnitKey, Map<UnitKey, Rational>>();

/** What one `from` is in `to`, both without offset; worked out once for each pair. */
function factorBetween(from: Unit, to: Unit): Rational {
  let row = factors.get(from.key);
  if (!row) factors.set(from.key, (row = new Map()));
  let factor = row.get(to.key);
  if (!factor) row.set(to.key, (factor = from.toBase.div(to.toBase)));
  return factor;
}

/** The number after conversion to `unit`. @throws RangeError when the two measure different kinds of things */
export function inUnit(q: Quantity, unit: UnitKey): Rational {
  if (q.unit === unit) return q.value;
  const from = units[q.unit];
  const to = units[unit];
  if (from.kind !== to.kind) throw new RangeError(`cannot convert ${from.kind} (${q.unit}) to ${to.kind} (${unit})`);
  if (!from.offset && !to.offset) return q.value.mul(factorBetween(from, to));
  let value = q.value.mul(from.toBase);
  if (from.offset) value = value.add(from.offset);
  if (to.offset) value = value.sub(to.offset);
  return value.div(to.toBase);
}

/** The same amount in another unit. @throws RangeError when the kinds differ */
export function convert(q: Quantity, unit: UnitKey): Quantity {
  return { value: inUnit(q, unit), unit };
}
/** Sum, in the first one's unit. @throws RangeError when the kinds differ */
export function add(a: Quantity, b: Quantity): Quantity {
  return { value: a.value.add(inUnit(b, a.unit)), unit: a.unit };
}
/** Difference, in the first one's unit. @throws RangeError when the kinds differ */
export function subtract(a: Quantity, b: Quantity): Quantity {
  return { value: a.value.sub(inUnit(b, a.unit)), unit: a.unit };
}
/** The quantity times a plain number. */
export function scale(q: Quantity, by: Rational | number | string): Quantity {
  return { value: q.value.mul(rational(by)), unit: q.unit };
}
/** How many times `b` goes into `a`. @throws RangeError when the kinds differ; Error on a zero `b` */
export function ratio(a: Quantity, b: Quantity): Rational {
  return a.value.div(inUnit(b, a.unit));
}
/** -1, 0 or 1 as `a` is less than, equal to or more than `b`. @throws RangeError when the kinds differ */
export function compare(a: Quantity, b: Quantity): -1 | 0 | 1 {
  return Math.sign(a.value.compare(inUnit(b, a.unit))) as -1 | 0 | 1;
}
/** Whether two quantities measure the same kind of thing. */
export function sameKind(a: Quantity, b: Quantity): boolean {
  return units[a.unit].kind === units[b.unit].kind;
}
