import { DrawingFrame } from '../frame.tsx';

const parts = [
  { number: 1, name: 'Tank, with the graduations you fill to', x: 150, y: 130 },
  { number: 2, name: 'Lid and filler opening with its basket strainer', x: 150, y: 34 },
  { number: 3, name: 'Pump handle, worked while you walk', x: 42, y: 228 },
  { number: 4, name: 'Pump and pressure chamber', x: 112, y: 216 },
  { number: 5, name: 'Hose', x: 232, y: 236 },
  { number: 6, name: 'Shut-off valve with trigger and handle', x: 246, y: 166 },
  { number: 7, name: 'Pressure gauge or regulator at the valve', x: 262, y: 126 },
  { number: 8, name: 'Wand', x: 296, y: 96 },
  { number: 9, name: 'Nozzle body: strainer, tip and cap', x: 330, y: 46 },
] as const;

/** A backpack sprayer from the side with numbered parts; the names stand in a list beside. */
export function BackpackSprayer() {
  const alt = `A backpack sprayer from the side. ${parts.map((part) => `${part.number}: ${part.name}.`).join(' ')}`;
  return (
    <div className="grid gap-4 sm:grid-cols-[1fr_15rem]">
      <DrawingFrame height={272} alt={alt}>
        <path
          d="M102 62q0 -14 14 -14h70q16 0 16 16v120q0 16 -16 16h-70q-14 0 -14 -14z"
          className="fill-sheet stroke-ink"
          strokeWidth="2"
        />
        <path d="M103 118q48 8 98 0v66q0 15 -15 15h-70q-13 0 -13 -13z" className="fill-dye" opacity=".35" />
        {[84, 100, 116, 132, 148, 164, 180].map((y) => (
          <path key={y} d={`M202 ${y}h-12`} className="stroke-ink" strokeWidth="1.4" />
        ))}
        <rect x="126" y="34" width="50" height="14" rx="3" className="fill-rule-strong stroke-ink" strokeWidth="1.5" />
        <path d="M102 76q-26 10 -26 60q0 34 20 54" className="stroke-ink" strokeWidth="7" fill="none" opacity=".45" />
        <path d="M122 200h48v26h-48z" className="fill-rule stroke-ink" strokeWidth="1.6" />
        <path d="M122 214H60q-22 0 -24 22" className="stroke-ink" strokeWidth="5" fill="none" strokeLinecap="round" />
        <path d="M170 214q60 34 62 10q0 -20 8 -44" className="stroke-ink" strokeWidth="4.5" fill="none" />
        <path d="M234 182l18 -34l12 6l-16 32z" className="fill-rule-strong stroke-ink" strokeWidth="1.5" />
        <path d="M250 174q14 -2 10 -14" className="stroke-ink" strokeWidth="3" fill="none" />
        <circle cx="262" cy="140" r="9" className="fill-sheet stroke-ink" strokeWidth="1.8" />
        <path d="M262 140l4 -5" className="stroke-clay" strokeWidth="2" />
        <path d="M260 150L326 58" className="stroke-ink" strokeWidth="4" />
        <path d="M320 54l10 -4l6 8l-8 6z" className="fill-rule-strong stroke-ink" strokeWidth="1.5" />
        <path d="M334 54l14 16M336 52l12 4" className="stroke-dye" strokeWidth="1.6" />
        <path d="M20 256H336" className="stroke-turf" strokeWidth="2" />
        {parts.map(({ number, x, y }) => (
          <g key={number}>
            <circle cx={x} cy={y} r="10.5" className="fill-ink" />
            <text x={x} y={y + 4.5} textAnchor="middle" fontSize="13" fontWeight="700" className="fill-sheet">
              {number}
            </text>
          </g>
        ))}
      </DrawingFrame>
      <ol className="list-decimal pl-6 text-sm">
        {parts.map(({ number, name }) => (
          <li key={number} className="mb-1">
            {name}
          </li>
        ))}
      </ol>
    </div>
  );
}
