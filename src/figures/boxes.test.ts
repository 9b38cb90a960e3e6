import { expect, test } from 'vitest';
import { cross, touches } from './boxes.ts';

const box = { left: 10, right: 30, top: 10, bottom: 20 };

test('lines that run through each other cross; those that only share an end do not', () => {
  expect(
    cross(
      [
        [0, 0],
        [10, 10],
      ],
      [
        [0, 10],
        [10, 0],
      ],
    ),
  ).toBe(true);
  expect(
    cross(
      [
        [0, 0],
        [10, 0],
      ],
      [
        [10, 0],
        [10, 10],
      ],
    ),
  ).toBe(false);
  expect(
    cross(
      [
        [0, 0],
        [10, 0],
      ],
      [
        [0, 5],
        [10, 5],
      ],
    ),
  ).toBe(false);
});

test.each([
  ['through it', [0, 15], [40, 15], true],
  ['upright through its end', [12, 0], [12, 40], true],
  ['beginning in it', [20, 15], [20, 60], true],
  ['over its corner', [5, 18], [18, 5], true],
  ['above it', [0, 5], [40, 5], false],
  ['beside it', [35, 0], [35, 40], false],
] as const)('a line %s', (_where, from, to, expected) => {
  expect(touches(box, [from, to])).toBe(expected);
});
