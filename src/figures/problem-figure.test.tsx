import { render, screen } from '@testing-library/react';
import { expect, test } from 'vitest';
import type { Figure } from '../../shared/contracts/figure.ts';
import { drawingWidth } from './frame.tsx';
import { ProblemFigure } from './problem-figure.tsx';

const figures: readonly Figure[] = [
  {
    kind: 'boom',
    nozzles: 12,
    spacing: '20 in',
    flow: '0.4 gal per minute each',
    speed: '4 mph',
    alt: 'A boom with 12 nozzles, 20 inches apart.',
  },
  { kind: 'tank', level: 0.4, capacity: '50 gal', levelText: '20 gal', alt: 'A 50-gallon tank filled to 20 gallons.' },
  {
    kind: 'nozzle-patterns',
    patterns: [
      { pattern: 'flat-fan', name: 'A' },
      { pattern: 'hollow-cone', name: 'B' },
      { pattern: 'stream', name: 'C' },
    ],
    alt: 'Three spray patterns, A to C.',
  },
  {
    kind: 'measures',
    tools: [
      { tool: 'teaspoon', name: 'teaspoon' },
      { tool: 'cup', name: 'cup' },
    ],
    alt: 'A teaspoon and a cup.',
  },
];

/** Width in which a problem's drawing stands on a phone 360 px wide, in px. */
const narrowestColumnPx = 266;

test.each(figures)(
  '$kind is one picture with its text equivalent, readable on a phone, nothing clipped',
  async (figure) => {
    render(<ProblemFigure figure={figure} describe="Describe the drawing" />);
    const drawing = await screen.findByRole('img', { name: figure.alt });
    expect(screen.getByText(figure.alt)).toBeInTheDocument();
    const [, , width = 0, height = 0] = (drawing.getAttribute('viewBox') ?? '').split(' ').map(Number);
    expect(width).toBe(drawingWidth);
    const scale = narrowestColumnPx / width;
    for (const text of drawing.querySelectorAll('text')) {
      const size = Number(text.getAttribute('font-size') ?? drawing.getAttribute('font-size'));
      expect(size * scale, text.textContent).toBeGreaterThanOrEqual(12);
      expect(Number(text.getAttribute('y') ?? 0), text.textContent).toBeLessThan(height);
    }
  },
);
