import type { PlanFigure } from '../../../shared/contracts/figure.ts';

/** Offsets of the example, ft, every 10 ft along a line of 60 ft whose ends are points. */
const offsets = [15, 10, 15, 25, 20];
const spacing = 10;
const line = 60;
const base = 26;

const edge = [
  [0, base],
  ...offsets.map((offset, index) => [(index + 1) * spacing, base - offset] as const),
  [line, base],
] as const;

/** An odd-shaped lawn with its longest line and evenly spaced offsets. */
export const offsetsPlan: PlanFigure = {
  kind: 'plan',
  width: line,
  height: base + 2,
  shapes: [{ form: 'polygon', points: edge, ground: 'turf' }],
  dimensions: [
    { from: [0, base], to: [line, base], text: '60 ft', place: 'outside', side: 'right' },
    ...offsets.map(
      (offset, index) =>
        ({
          from: [(index + 1) * spacing, base],
          to: [(index + 1) * spacing, base - offset],
          text: String(offset),
          place: 'inside',
          side: 'right',
          dashed: true,
        }) as const,
    ),
  ],
  alt: 'A lawn with one straight edge 60 feet long. Every 10 feet along it an offset runs square across: 15, 10, 15, 25 and 20 feet. At both ends the lawn comes to a point.',
};
