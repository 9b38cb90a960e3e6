import type { PlanDimension, PlanFigure, Point } from '../../shared/contracts/figure.ts';
import { drawingWidth, textWidth } from './frame.tsx';

/** Where a plan stands on the paper: its scale and the corner its own zero comes to. */
export interface PlanLayout {
  scale: number;
  left: number;
  top: number;
  height: number;
  at: (point: Point) => Point;
}

/** Distance of an outside dimension line from its edge. */
export const dimensionGap = 16;
const smallestMargin = 14;
const mostHeight = 290;

/** Which way a dimension is pushed: the side of the line from `from` to `to`, y pointing down. */
export function outward({ from, to, side }: PlanDimension<string>): Point {
  const dx = to[0] - from[0];
  const dy = to[1] - from[1];
  const length = Math.hypot(dx, dy) || 1;
  // Seen along the line with y down, the left hand lies at (dy, -dx).
  const turn = side === 'left' ? 1 : -1;
  return [(turn * dy) / length, (-turn * dx) / length];
}

interface Margins {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

function margins(figure: PlanFigure): Margins {
  const room: Margins = { left: smallestMargin, right: smallestMargin, top: smallestMargin, bottom: smallestMargin };
  for (const dimension of figure.dimensions) {
    if (dimension.place !== 'outside') continue;
    const [nx, ny] = outward(dimension);
    const across = textWidth(dimension.text);
    const grow = (side: keyof Margins, wanted: number) => {
      room[side] = Math.max(room[side], wanted);
    };
    if (nx < -0.5) grow('left', dimensionGap + across + 8);
    if (nx > 0.5) grow('right', dimensionGap + across + 8);
    if (ny < -0.5) grow('top', dimensionGap + 24);
    if (ny > 0.5) grow('bottom', dimensionGap + 24);
  }
  return room;
}

/** Fits a plan to the paper, true to scale, leaving room for the dimensions outside it. */
export function planLayout(figure: PlanFigure): PlanLayout {
  const room = margins(figure);
  const scale = Math.min(
    (drawingWidth - room.left - room.right) / figure.width,
    (mostHeight - room.top - room.bottom) / figure.height,
  );
  const width = figure.width * scale;
  const left = room.left + Math.max(0, (drawingWidth - room.left - room.right - width) / 2);
  const { top } = room;
  return {
    scale,
    left,
    top,
    height: top + figure.height * scale + room.bottom,
    at: ([x, y]) => [left + x * scale, top + y * scale],
  };
}
