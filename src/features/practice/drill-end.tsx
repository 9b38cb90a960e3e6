import { useStore } from '@nanostores/react';
import type { DrillView } from '../../../shared/contracts/practice.ts';
import { drillMessages } from '../../i18n/drills.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { useNewDrill } from './queries.ts';

const lengths = [5, 10, 20] as const;

/** How a drill went, and what can be done next. */
export function DrillEnd({
  drill,
  chooseAt,
  onMade,
}: {
  drill: DrillView;
  chooseAt: string;
  onMade: (id: string) => void;
}) {
  const t = useStore(drillMessages);
  const make = useNewDrill();
  const right = drill.places.filter((place) => place.outcome === 'right').length;
  const partly = drill.places.filter((place) => place.outcome === 'partly').length;
  const length = lengths.find((one) => one === drill.length) ?? 10;
  const again = () =>
    make.mutate({ topics: drill.topics, tier: drill.tier, length }, { onSuccess: (made) => onMade(made.id) });
  return (
    <Sheet graduated>
      <h2>{t.doneTitle}</h2>
      <p className="mt-2 mb-4 font-serif text-lg">
        {t.doneText({ right, length: drill.length })} {partly > 0 && t.partly(partly)}
      </p>
      <Failure error={make.error} />
      <div className="flex flex-wrap gap-3">
        <Button onClick={again} disabled={make.isPending}>
          {t.again}
        </Button>
        <ButtonLink look="quiet" to={chooseAt}>
          {t.other}
        </ButtonLink>
      </div>
    </Sheet>
  );
}
