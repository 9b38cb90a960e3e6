import { useStore } from '@nanostores/react';
import { useState } from 'react';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useGiveUp } from './queries.ts';

/** Shows the worked solution before all parts are done; asks once, saying what it costs. */
export function GiveUp({ problemId }: { problemId: string }) {
  const t = useStore(practiceMessages);
  const [asking, setAsking] = useState(false);
  const giveUp = useGiveUp(problemId);
  if (!asking) {
    return (
      <Button look="plain" onClick={() => setAsking(true)}>
        {t.giveUp}
      </Button>
    );
  }
  return (
    <section aria-label={t.giveUp} className="w-full border-l-4 border-brass bg-brass-wash p-3">
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
