import { useId } from 'react';
import type { LevelView } from '../../shared/contracts/practice.ts';
import type { ChipTone } from './chip.tsx';

const top = 6;
const height = 84;

const liquids: Record<LevelView['state'], string> = {
  'not-started': 'fill-rule',
  filling: 'fill-dye',
  'at-the-mark': 'fill-turf',
  'top-up': 'fill-brass',
};
export const levelTones: Record<LevelView['state'], ChipTone> = {
  'not-started': 'none',
  filling: 'filling',
  'at-the-mark': 'mark',
  'top-up': 'topUp',
};

/** A topic's level as liquid in a sight tube, with the red line at the mark and a faint band for its likely range. */
export function SightTube({
  level,
  className = '',
}: {
  level: Pick<LevelView, 'state' | 'fill' | 'range'>;
  className?: string;
}) {
  const clip = useId();
  const yOf = (share: number) => top + height * (1 - share);
  const y = level.fill === null ? null : yOf(level.fill);
  return (
    <svg width="44" height="96" viewBox="0 0 44 96" aria-hidden="true" className={`flex-none ${className}`}>
      <clipPath id={clip}>
        <rect x="7" y="3" width="18" height="90" rx="8" />
      </clipPath>
      <rect x="6" y="2" width="20" height="92" rx="9" className="fill-sheet stroke-ink" strokeWidth="1.5" />
      <g clipPath={`url(#${clip})`}>
        {level.range && (
          <rect
            x="7"
            y={yOf(level.range.high)}
            width="18"
            height={height * (level.range.high - level.range.low)}
            className={liquids[level.state]}
            opacity=".22"
          />
        )}
        {y !== null && <path d={`M7 ${y}q9 4 18 0V94H7z`} className={liquids[level.state]} opacity=".88" />}
      </g>
      {Array.from({ length: 11 }, (_, index) => (
        <path
          key={index}
          d={`M${index % 5 ? 33 : 30} ${top + (height * index) / 10}h${index % 5 ? 5 : 8}`}
          className="stroke-rule-strong"
        />
      ))}
      <path d={`M3 ${yOf(0.8)}h26`} className="stroke-clay" strokeWidth="1.6" />
    </svg>
  );
}
