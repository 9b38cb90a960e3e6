import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compare, convert, quantity, scale } from '../quantity/quantity.ts';
import { rational } from '../quantity/rational.ts';
import { acresOf } from './acres-of.ts';
import { circleArea } from './circle-area.ts';
import { rectangleArea } from './rectangle-area.ts';
import { triangleArea } from './triangle-area.ts';

const ft = (value: number | string) => quantity(value, 'ft');
const sqFt = (value: number | string) => quantity(value, 'sq-ft');

describe('areas', () => {
  it('rectangle: 60 ft by 30 ft is 1,800 sq ft, and inches count as inches', () => {
    expect(compare(rectangleArea({ length: ft(60), width: ft(30) }), sqFt(1800))).toBe(0);
    expect(compare(rectangleArea({ length: ft(100), width: quantity(18, 'in') }), sqFt(150))).toBe(0);
  });

  it('triangle: half of the rectangle on the same sides', () => {
    const side = fc.integer({ min: 1, max: 5000 });
    fc.assert(
      fc.property(side, side, (base, height) => {
        const half = scale(rectangleArea({ length: ft(base), width: ft(height) }), '0.5');
        expect(compare(triangleArea({ base: ft(base), height: ft(height) }), half)).toBe(0);
      }),
    );
  });

  it('circle: with 3.14 a radius of 10 ft is 314 sq ft exactly, with another pi it follows', () => {
    expect(compare(circleArea({ radius: ft(10) }), sqFt(314))).toBe(0);
    expect(compare(circleArea({ radius: ft(10), pi: rational('3.1416') }), sqFt('314.16'))).toBe(0);
  });

  it('acres: 43,560 sq ft is one acre and there and back changes nothing', () => {
    expect(compare(acresOf({ area: sqFt(43560) }), quantity(1, 'acre'))).toBe(0);
    expect(convert(acresOf({ area: sqFt(1234) }), 'sq-ft').value.toFraction()).toBe('1234');
  });

  it.each([
    ['a side of zero', () => rectangleArea({ length: ft(0), width: ft(3) })],
    ['a negative height', () => triangleArea({ base: ft(3), height: ft(-1) })],
    ['a radius of zero', () => circleArea({ radius: ft(0) })],
    ['a pi of zero', () => circleArea({ radius: ft(1), pi: rational(0) })],
    ['no area', () => acresOf({ area: sqFt(0) })],
    ['a volume for a side', () => rectangleArea({ length: quantity(1, 'gal'), width: ft(3) })],
  ])('%s is refused with a RangeError', (_, call) => {
    expect(call).toThrow(RangeError);
  });
});
