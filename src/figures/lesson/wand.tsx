/**
 * Shut-off valve, wand and nozzle, held low over the ground as on turf. The hose joins at 0,0; the drops reach the ground at
 * 83,144.
 */
export function Wand({ x, y, regulator = false }: { x: number; y: number; regulator?: boolean }) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <path d="M83 119L64 144H102z" className="fill-dye" opacity=".35" />
      <path d="M22 28L78 94q5 6 5 12" className="stroke-ink" strokeWidth="4.5" fill="none" />
      <path d="M77 106h12v8l-3 5h-6l-3 -5z" className="fill-rule stroke-ink" strokeWidth="1.6" strokeLinejoin="round" />
      <path d="M5 -5L31 26l-9 8L-4 3z" className="fill-rule stroke-ink" strokeWidth="1.6" strokeLinejoin="round" />
      <path d="M6 -6q18 -1 28 19" className="stroke-ink" strokeWidth="3" fill="none" strokeLinecap="round" />
      {regulator && (
        <path d="M32 27l9 11l-9 8l-9 -11z" className="fill-sheet stroke-ink" strokeWidth="1.8" strokeLinejoin="round" />
      )}
    </g>
  );
}
