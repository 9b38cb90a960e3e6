import type { ReactNode } from 'react';

const tones = {
  mark: 'bg-turf-wash text-turf',
  topUp: 'bg-brass-wash text-brass',
  filling: 'bg-dye-wash text-dye-deep',
  none: 'bg-tank text-ink-soft ring-1 ring-rule',
  late: 'bg-clay-wash text-clay',
} as const;
export type ChipTone = keyof typeof tones;

export function Chip({ tone, children }: { tone: ChipTone; children: ReactNode }) {
  return (
    <span className={`inline-block rounded-[2px] px-1.5 text-[0.8125rem] font-semibold ${tones[tone]}`}>
      {children}
    </span>
  );
}
