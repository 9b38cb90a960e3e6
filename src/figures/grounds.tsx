import { useId } from 'react';
import type { Ground } from '../../shared/contracts/figure.ts';

/** Fill of each ground besides its hatching. */
export const groundFill: Record<Ground, string> = {
  turf: 'fill-turf-wash',
  bed: 'fill-brass-wash',
  hard: 'fill-tank',
  building: 'fill-rule',
  water: 'fill-dye-wash',
  soil: 'fill-brass-wash',
  swath: 'fill-dye-wash',
  outline: 'fill-none',
};

const hatched = ['turf', 'bed', 'hard', 'water', 'swath'] as const;
type Hatched = (typeof hatched)[number];

export function isHatched(ground: Ground): ground is Hatched {
  return hatched.some((one) => one === ground);
}

/** Hatchings, so that no ground is told by its color alone. */
export function useHatching(): { defs: React.ReactNode; url: (ground: Hatched) => string } {
  const id = useId();
  const name = (ground: Hatched) => `${id}-${ground}`;
  const defs = (
    <defs>
      <pattern id={name('turf')} width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(35)">
        <path d="M0 0v8" className="stroke-turf" strokeWidth=".7" opacity=".5" />
      </pattern>
      <pattern id={name('bed')} width="9" height="9" patternUnits="userSpaceOnUse">
        <circle cx="2.5" cy="2.5" r="1" className="fill-brass" opacity=".6" />
        <circle cx="7" cy="7" r="1" className="fill-brass" opacity=".6" />
      </pattern>
      <pattern id={name('hard')} width="12" height="12" patternUnits="userSpaceOnUse">
        <path d="M0 0h12v12" fill="none" className="stroke-rule-strong" strokeWidth=".8" opacity=".7" />
      </pattern>
      <pattern id={name('water')} width="16" height="8" patternUnits="userSpaceOnUse">
        <path d="M0 4q4-3 8 0t8 0" fill="none" className="stroke-dye" strokeWidth=".8" opacity=".6" />
      </pattern>
      <pattern id={name('swath')} width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(35)">
        <path d="M0 0v8" className="stroke-dye" strokeWidth=".8" opacity=".5" />
      </pattern>
    </defs>
  );
  return { defs, url: (ground) => `url(#${name(ground)})` };
}
