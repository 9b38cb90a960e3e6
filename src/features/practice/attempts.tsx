import { useStore } from '@nanostores/react';
import { useEffect, useRef } from 'react';
import type { PartView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { VerdictPanel } from '../../ui/verdict.tsx';

/** What grading said: the newest answer in full, earlier ones folded. A new verdict takes the focus and is read out. */
export function Attempts({ part }: { part: PartView }) {
  const t = useStore(practiceMessages);
  const verdict = useRef<HTMLDivElement>(null);
  const count = part.attempts.length;
  const shown = useRef(count);
  const newest = part.attempts.at(-1);
  const earlier = part.attempts.slice(0, -1);
  // What an entry was read as belongs to numbers; a choice and an order stand there as they were given.
  const withReading = part.kind === 'number' || part.kind === 'count';
  useEffect(() => {
    // A part left open is no news: the worked solution, asked for, takes the focus.
    if (count > shown.current && newest?.verdict !== 'blank') verdict.current?.focus();
    shown.current = count;
  }, [count, newest]);
  return (
    <>
      <div aria-live="polite">
        {newest && <VerdictPanel key={count} attempt={newest} withReading={withReading} ref={verdict} />}
      </div>
      {earlier.length > 0 && (
        <details className="mt-2 text-sm">
          <summary className="inline-flex min-h-6 items-center text-ink-soft underline underline-offset-4">
            {t.earlier(earlier.length)}
          </summary>
          {earlier.map((attempt, index) => (
            // Attempts are only ever added: their place is who they are.
            // oxlint-disable-next-line react/no-array-index-key
            <VerdictPanel key={index} attempt={attempt} withReading={withReading} />
          ))}
        </details>
      )}
    </>
  );
}
