import { DrawingFrame } from '../frame.tsx';

const alt =
  'Two drawings of the spray from two nozzles side by side, with the amount of spray along the ground drawn below as a height. Tapered flat fans overlap at their edges and the amounts add up to a level line. Even flat fans that overlap leave a strip with twice the amount.';

interface RowProps {
  y: number;
  title: string;
  note: string;
  amount: string;
}

/** A pair of nozzles at 115 and 235, and below them how much spray lies along the ground. */
function Pair({ y, title, note, amount }: RowProps) {
  return (
    <g transform={`translate(0 ${y})`}>
      <text x="8" y="15" fontWeight="600">
        {title}
      </text>
      {[115, 235].map((x) => (
        <g key={x}>
          <path d={`M${x} 36L${x - 82} 92H${x + 82}z`} className="fill-dye" opacity=".22" />
          <path d={`M${x - 7} 22h14v9l-4 6h-6l-4 -6z`} className="fill-sheet stroke-ink" strokeWidth="1.5" />
        </g>
      ))}
      <path d="M14 93H336" className="stroke-turf" strokeWidth="2.5" />
      <path d={amount} className="fill-dye stroke-ink" strokeWidth="1.4" strokeLinejoin="round" />
      <text x="175" y="176" textAnchor="middle" fontSize="14">
        {note}
      </text>
    </g>
  );
}

/** Why a tapered fan may overlap its neighbor and an even fan may not. */
export function FanOverlap() {
  return (
    <DrawingFrame height={372} alt={alt}>
      <Pair y={0} title="Tapered fans" note="edges add up: level" amount="M33 154L77 130H273L317 154z" />
      <Pair
        y={190}
        title="Even fans"
        note="where they overlap: twice the dose"
        amount="M33 154V130H153V106H197V130H317V154z"
      />
    </DrawingFrame>
  );
}
