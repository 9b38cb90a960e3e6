import { useStore } from '@nanostores/react';
import type { PartView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useHint } from './queries.ts';

/** The hints shown so far, and the press for the next one. */
export function Hints({ problemId, part }: { problemId: string; part: PartView }) {
  const t = useStore(practiceMessages);
  const hint = useHint(problemId);
  const next = part.hints.length + 1;
  return (
    <>
      {part.hintsLeft > 0 && (
        <Button look="plain" disabled={hint.isPending} onClick={() => hint.mutate({ part: part.key, number: next })}>
          {t.hint({ number: next })}
        </Button>
      )}
      <Failure error={hint.error} className="w-full" />
      <div aria-live="polite" className={part.hints.length > 0 ? 'w-full' : ''}>
        {part.hints.map((text, index) => (
          <p key={text} className="mt-2 max-w-[44rem] border-l-4 border-dye bg-dye-wash px-3 py-2">
            <b>{t.hintShown({ number: index + 1 })}.</b> {text}
          </p>
        ))}
      </div>
    </>
  );
}
