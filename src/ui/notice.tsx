import type { ReactNode } from 'react';

const tones = {
  caution: 'border-brass text-ink-soft',
  error: 'border-clay bg-clay-wash text-ink px-3 py-2',
  good: 'border-turf bg-turf-wash text-ink px-3 py-2',
  plain: 'border-rule-strong bg-sheet px-3 py-2',
} as const;

/** A remark beside the work. An error is announced at once. */
export function Notice({
  tone,
  children,
  className = '',
}: {
  tone: keyof typeof tones;
  children: ReactNode;
  className?: string;
}) {
  return (
    <div role={tone === 'error' ? 'alert' : undefined} className={`border-l-[3px] pl-3 ${tones[tone]} ${className}`}>
      {children}
    </div>
  );
}
