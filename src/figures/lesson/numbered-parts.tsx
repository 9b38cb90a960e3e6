import type { ReactNode } from 'react';
import { DrawingFrame } from '../frame.tsx';

export interface NumberedPart {
  name: string;
  /** Where its number stands. */
  at: readonly [x: number, y: number];
  /** The spot on the part that a line leads to. */
  on: readonly [x: number, y: number];
}

interface NumberedPartsProps {
  title: string;
  height: number;
  parts: readonly NumberedPart[];
  children: ReactNode;
}

/** A drawing with numbers at its parts; the names stand in a list beside it. */
export function NumberedParts({ title, height, parts, children }: NumberedPartsProps) {
  const alt = `${title}. ${parts.map(({ name }, index) => `${index + 1}: ${name}.`).join(' ')}`;
  return (
    <div className="grid items-start gap-4 sm:grid-cols-[minmax(0,1fr)_15rem]">
      <DrawingFrame height={height} alt={alt}>
        {children}
        {parts.map(({ name, at, on }, index) => (
          <g key={name}>
            <path d={`M${at.join(' ')}L${on.join(' ')}`} className="stroke-ink-soft" strokeWidth="1" />
            <circle cx={on[0]} cy={on[1]} r="2.5" className="fill-ink-soft" />
            <circle cx={at[0]} cy={at[1]} r="11" className="fill-ink" />
            <text x={at[0]} y={at[1] + 5} textAnchor="middle" fontSize="14" fontWeight="700" className="fill-sheet">
              {index + 1}
            </text>
          </g>
        ))}
      </DrawingFrame>
      <div>
        <p className="mb-1.5 font-semibold">{title}</p>
        <ol className="list-decimal pl-6 text-[0.95rem] leading-snug">
          {parts.map(({ name }) => (
            <li key={name} className="mb-1">
              {name}
            </li>
          ))}
        </ol>
      </div>
    </div>
  );
}
