import { useStore } from '@nanostores/react';
import type { DrillView } from '../../../shared/contracts/practice.ts';
import { todayMessages } from '../../i18n/today.ts';
import { topicMessages } from '../../i18n/words.ts';
import { ButtonLink } from '../../ui/button.tsx';

/** The newest drill that is still open, with the way back into it. */
export function OpenDrill({ drills, linkTo }: { drills: readonly DrillView[]; linkTo: (id: string) => string }) {
  const t = useStore(todayMessages);
  const names = useStore(topicMessages);
  const open = drills.find((drill) => drill.state === 'open');
  if (!open) return null;
  const done = open.places.filter((place) => place.outcome !== 'waiting' && place.outcome !== 'open').length;
  const topics = open.topics.map((topic) => names[topic]).join(', ');
  return (
    <div className="mb-6 border-b border-rule pb-5">
      <h2>{t.openTitle}</h2>
      <p className="mt-2 mb-3 font-serif">{t.openDrill({ topics, done, length: open.length })}</p>
      <ButtonLink look="quiet" to={linkTo(open.id)}>
        {t.goOn}
      </ButtonLink>
    </div>
  );
}
