import { useStore } from '@nanostores/react';
import type { Ref } from 'react';
import type { AttemptView } from '../../shared/contracts/practice.ts';
import { verdictMessages } from '../i18n/verdict.ts';

const looks = {
  right: { box: 'border-turf bg-turf-wash', sign: 'text-turf', path: 'M3 9l4 4 8-9' },
  carried: { box: 'border-brass bg-brass-wash', sign: 'text-brass', path: 'M3 6h9M8 2l5 4-5 4M3 13h12' },
  slip: { box: 'border-clay bg-clay-wash', sign: 'text-clay', path: 'M9 2L16 15H2zM9 6v4M9 12.500v.500' },
  blank: { box: 'border-rule-strong bg-tank', sign: 'text-ink-soft', path: 'M4 9h10' },
} as const;

function lookOf(verdict: AttemptView['verdict']): keyof typeof looks {
  if (verdict === 'right' || verdict === 'carried' || verdict === 'blank') return verdict;
  return 'slip';
}

interface VerdictPanelProps {
  attempt: AttemptView;
  /** Whether to say how the entry was read. */
  withReading?: boolean;
  ref?: Ref<HTMLDivElement>;
}

/** What grading says of one answer: a word, a shape and a color; then the mistake by name, with these numbers. */
export function VerdictPanel({ attempt, withReading = true, ref }: VerdictPanelProps) {
  const t = useStore(verdictMessages);
  const kind = lookOf(attempt.verdict);
  const look = looks[kind];
  const word = kind === 'slip' ? (attempt.slip === null ? t.notYet : t.slip) : t[kind];
  return (
    <div
      ref={ref}
      tabIndex={-1}
      data-quiet-focus=""
      className={`mt-2.5 max-w-[44rem] scroll-mb-24 border-l-4 px-3 py-2.5 ${look.box}`}
    >
      <p className={`flex items-center gap-1.5 text-sm font-bold ${look.sign}`}>
        <svg
          width="18"
          height="18"
          viewBox="0 0 18 18"
          aria-hidden="true"
          fill="none"
          stroke="currentColor"
          strokeWidth="2.2"
        >
          <path d={look.path} />
        </svg>
        {word}
      </p>
      {attempt.headline !== `${word}.` && <p className="font-bold">{attempt.headline}</p>}
      {attempt.detail !== '' && <p>{attempt.detail}</p>}
      {withReading && attempt.read !== '' && (
        <p className="mt-1 text-sm text-ink-soft">{t.readAs({ read: attempt.read })}</p>
      )}
    </div>
  );
}
