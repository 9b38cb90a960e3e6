import { useStore } from '@nanostores/react';
import { useEffect, useRef, useState } from 'react';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useGiveUp } from './queries.ts';

/** Shows the worked solution before all parts are done; asks once, saying what it costs. */
export function GiveUp({ problemId }: { problemId: string }) {
  const t = useStore(practiceMessages);
  const [asking, setAsking] = useState(false);
  const giveUp = useGiveUp(problemId);
  const question = useRef<HTMLElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  const wasAsking = useRef(false);
  useEffect(() => {
    if (asking) question.current?.focus();
    else if (wasAsking.current) button.current?.focus();
    wasAsking.current = asking;
  }, [asking]);
  if (!asking) {
    return (
      <Button ref={button} look="plain" onClick={() => setAsking(true)}>
        {t.giveUp}
      </Button>
    );
  }
  return (
    <section
      ref={question}
      tabIndex={-1}
      data-quiet-focus=""
      aria-label={t.giveUp}
      className="w-full border-l-4 border-brass bg-brass-wash p-3"
    >
      <p className="mb-2">{t.giveUpAsk}</p>
      <Failure error={giveUp.error} />
      <div className="flex flex-wrap gap-3">
        <Button look="quiet" disabled={giveUp.isPending} onClick={() => giveUp.mutate()}>
          {t.giveUpYes}
        </Button>
        <Button look="plain" onClick={() => setAsking(false)}>
          {t.giveUpNo}
        </Button>
      </div>
    </section>
  );
}
