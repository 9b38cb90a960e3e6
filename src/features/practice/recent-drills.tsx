import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import type { DrillView } from '../../../shared/contracts/practice.ts';
import { drillMessages } from '../../i18n/drills.ts';
import { topicMessages } from '../../i18n/words.ts';

/** The drills of late, newest first, with what became of them. */
export function RecentDrills({ drills, linkTo }: { drills: readonly DrillView[]; linkTo: (id: string) => string }) {
  const t = useStore(drillMessages);
  const names = useStore(topicMessages);
  if (drills.length === 0) return <p className="text-ink-soft">{t.noRecent}</p>;
  return (
    <ul className="max-w-[44rem]">
      {drills.map((drill) => {
        const done = drill.places.filter((place) => place.outcome !== 'waiting' && place.outcome !== 'open').length;
        const right = drill.places.filter((place) => place.outcome === 'right').length;
        return (
          <li key={drill.id} className="border-t border-rule py-2.5 first:border-t-0">
            <Link to={linkTo(drill.id)} className="inline-flex min-h-6 items-center font-semibold">
              {drill.topics.map((topic) => names[topic]).join(', ')}
            </Link>
            <p className="text-sm text-ink-soft">{t.state({ done, length: drill.length, right })}</p>
          </li>
        );
      })}
    </ul>
  );
}
