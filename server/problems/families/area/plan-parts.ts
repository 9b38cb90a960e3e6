import type { PlanDimension, Point } from '../../../../shared/contracts/figure.ts';
import { quantity, type Quantity } from '../../../../shared/quantity/quantity.ts';
import { rational, type Rational } from '../../../../shared/quantity/rational.ts';
import type { UnitKey } from '../../../../shared/quantity/units.ts';
import type { Text } from '../../../../shared/vocabulary.ts';
import { about, given, type Expression, type WorkingLine } from '../../working.ts';

/** A rational as the nearest double, for drawing only; never goes back into a formula. */
export function drawn(value: Rational | string | number): number {
  return rational(value).valueOf();
}

/**
 * Outside dimension of an edge. Name the points clockwise round the shape as drawn (top edge left to right, right edge
 * downward): then the text stands clear of the shape.
 */
export function edge(from: Point, to: Point, text: Text): PlanDimension<Text> {
  return { from, to, text, place: 'outside', side: 'left' };
}

/** A dimension drawn on its own line inside a shape, dashed where nothing stands on the ground: a height, a radius. */
export function across(from: Point, to: Point, text: Text): PlanDimension<Text> {
  return { from, to, text, place: 'inside', side: 'left', dashed: true };
}

interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** The width of a rectangle along its top edge and the depth along its right edge. */
export function boxDimensions(box: Box, texts: { readonly width: Text; readonly height: Text }): PlanDimension<Text>[] {
  const right = box.x + box.width;
  return [
    edge([box.x, box.y], [right, box.y], texts.width),
    edge([right, box.y], [right, box.y + box.height], texts.height),
  ];
}

/** Areas of sites are asked to the whole square foot. */
export const oneSqFt = rational(1);
/** Units offered for an area, the asked one first. */
export const areaUnits: readonly UnitKey[] = ['sq-ft', 'sq-yd', 'acre'];

export function sqFt(value: Rational | number | string): Quantity {
  return quantity(value, 'sq-ft');
}

/** The last step of an area: the exact figure, then the whole square feet one writes down. */
export function toWholeSqFt(expression: Expression, area: Quantity): Pick<WorkingLine, 'expression' | 'result'> {
  if (area.value.d === 1n) return { expression, result: given(area) };
  return { expression, result: about(given(area), given(area, { places: 0 })) };
}
