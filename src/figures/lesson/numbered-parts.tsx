import { useId, useState, type ReactNode } from 'react';
import { DrawingFrame } from '../frame.tsx';

export interface NumberedPart {
  name: string;
  /** Where its number stands. */
  at: readonly [x: number, y: number];
  /** The spot on the part that a line leads to. */
  on: readonly [x: number, y: number];
}

function NumberMark({ part, number, chosen }: { part: NumberedPart; number: number; chosen: boolean }) {
  const { at, on } = part;
  return (
    <g>
      <path
        d={`M${at.join(' ')}L${on.join(' ')}`}
        className={chosen ? 'stroke-clay' : 'stroke-ink-soft'}
        strokeWidth={chosen ? 2.5 : 1}
      />
      <circle cx={on[0]} cy={on[1]} r={chosen ? 5 : 2.5} className={chosen ? 'fill-clay' : 'fill-ink-soft'} />
      <circle cx={at[0]} cy={at[1]} r={chosen ? 13.5 : 11} className={chosen ? 'fill-clay' : 'fill-ink'} />
      <text x={at[0]} y={at[1] + 5} textAnchor="middle" fontSize="14" fontWeight="700" className="fill-sheet">
        {number}
      </text>
    </g>
  );
}

interface NumberedPartsProps {
  title: string;
  height: number;
  parts: readonly NumberedPart[];
  children: ReactNode;
}

/** A drawing with numbers at its parts. The names stand in a list beside it; pressing one marks its part in the drawing. */
export function NumberedParts({ title, height, parts, children }: NumberedPartsProps) {
  const [chosen, setChosen] = useState<number | null>(null);
  const heading = useId();
  const alt = `${title}. ${parts.map(({ name }, index) => `${index + 1}: ${name}.`).join(' ')}`;
  return (
    <div className="grid items-start gap-4 sm:grid-cols-[minmax(0,1fr)_15rem]">
      <DrawingFrame height={height} alt={alt}>
        {children}
        {parts.map((part, index) => (
          <NumberMark key={part.name} part={part} number={index + 1} chosen={index === chosen} />
        ))}
      </DrawingFrame>
      <div>
        <p id={heading} className="mb-1 font-semibold">
          {title}
        </p>
        <ol aria-labelledby={heading} className="text-[0.95rem] leading-snug">
          {parts.map(({ name }, index) => (
            <li key={name}>
              <button
                type="button"
                aria-pressed={index === chosen}
                className="flex w-full gap-2 py-1 text-left hover:underline aria-pressed:font-semibold aria-pressed:text-clay"
                onClick={() => setChosen(index === chosen ? null : index)}
              >
                <span className="w-5 shrink-0 text-right tabular-nums">{index + 1}</span>
                {name}
              </button>
            </li>
          ))}
        </ol>
      </div>
    </div>
  );
}
