import { useStore } from '@nanostores/react';
import { Link } from 'react-router';
import type { DrillView } from '../../../shared/contracts/practice.ts';
import { drillMessages } from '../../i18n/drills.ts';

type Place = DrillView['places'][number];

const looks: Record<Place['outcome'], string> = {
  right: 'bg-turf text-sheet',
  partly: 'bg-brass text-sheet',
  wrong: 'bg-clay text-sheet',
  open: 'bg-dye-wash text-dye-deep',
  waiting: 'bg-sheet text-ink-soft',
};
const signs: Record<Place['outcome'], string> = { right: '✓', partly: '◐', wrong: '✕', open: '▾', waiting: '' };

/** At most ten marks a row on a phone: more would be too narrow to read and to press. */
const columns: Record<number, string> = { 5: 'grid-cols-5', 10: 'grid-cols-10', 20: 'grid-cols-10 wide:grid-cols-20' };

function useOutcome(): (place: Place) => string {
  const t = useStore(drillMessages);
  const words = {
    right: t.outcomeRight,
    partly: t.outcomePartly,
    wrong: t.outcomeWrong,
    open: t.outcomeOpen,
    waiting: t.outcomeWaiting,
  };
  return (place) => words[place.outcome];
}

/** The measuring scale as the way through a drill: a numbered mark a problem, filled where it is done. */
export function DrillScale({
  drill,
  shownId,
  linkTo,
}: {
  drill: DrillView;
  shownId: string | null;
  linkTo: (problemId: string) => string;
}) {
  const t = useStore(drillMessages);
  const outcome = useOutcome();
  return (
    <ol
      className={`mb-4 grid max-w-[44rem] gap-px overflow-hidden rounded-md border border-ink bg-rule-strong ${columns[drill.length] ?? 'grid-cols-10'}`}
    >
      {drill.places.map((place) => {
        const name = `${t.progressLabel({ position: place.position, length: drill.length })}: ${outcome(place)}`;
        const here = place.problemId !== null && place.problemId === shownId;
        const look = `flex min-h-9 w-full flex-col items-center justify-center text-[0.8125rem] leading-none font-semibold tabular-nums no-underline ${looks[place.outcome]} ${here ? 'outline-[3px] -outline-offset-[3px] outline-ink' : ''}`;
        const inside = (
          <>
            <span aria-hidden="true">{place.position}</span>
            <span aria-hidden="true" className="h-3 text-[0.7rem] leading-3">
              {signs[place.outcome]}
            </span>
            <span className="sr-only">{name}</span>
          </>
        );
        return (
          <li key={place.position} className="flex">
            {place.problemId === null ? (
              <span className={look}>{inside}</span>
            ) : (
              <Link to={linkTo(place.problemId)} replace className={look} aria-current={here ? 'step' : undefined}>
                {inside}
              </Link>
            )}
          </li>
        );
      })}
    </ol>
  );
}
