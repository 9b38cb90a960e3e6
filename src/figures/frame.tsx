import type { ReactNode } from 'react';

/** Width of every drawing in its own units; text of 16 units stays above 12 px in a column of 266 px, a problem's on a phone 360 px wide. */
export const drawingWidth = 350;

/** The paper of a drawing: as wide as its column up to 30rem, its text equivalent read by screen readers. */
export function DrawingFrame({ height, alt, children }: { height: number; alt: string; children: ReactNode }) {
  return (
    <svg
      viewBox={`0 0 ${drawingWidth} ${Math.ceil(height)}`}
      role="img"
      aria-label={alt}
      className="block h-auto w-full max-w-[25rem] font-sans text-ink"
      fontSize="16"
      fill="currentColor"
    >
      {children}
    </svg>
  );
}

/** Width that a text of 16 units takes, a little on the wide side: nothing in a browser is needed to know it. */
export function textWidth(text: string): number {
  return text.length * 8.1 + 6;
}
