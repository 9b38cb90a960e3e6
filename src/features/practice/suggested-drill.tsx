import { useStore } from '@nanostores/react';
import type { LevelView } from '../../../shared/contracts/practice.ts';
import { todayMessages } from '../../i18n/today.ts';
import { topicMessages } from '../../i18n/words.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useNewDrill } from './queries.ts';
import { suggestDrill } from './suggest.ts';

/** A drill on the topics that need it most, one press away. */
export function SuggestedDrill({
  levels,
  chooseAt,
  onMade,
}: {
  levels: readonly LevelView[];
  chooseAt: string;
  onMade: (drillId: string) => void;
}) {
  const t = useStore(todayMessages);
  const names = useStore(topicMessages);
  const make = useNewDrill();
  const suggestion = suggestDrill(levels);
  if (!suggestion) return null;
  const [first = '', last] = suggestion.topics.map((topic) => names[topic]);
  const topics = last === undefined ? first : t.and({ first, last });
  const begin = () =>
    make.mutate({ topics: suggestion.topics, tier: 'rising', length: 5 }, { onSuccess: (drill) => onMade(drill.id) });
  return (
    <>
      <h2>{t.suggestTitle}</h2>
      <p className="mt-2 mb-4 max-w-[34rem] font-serif">
        {t.suggestText({ topics })} {suggestion.why === 'new' ? t.suggestWhyNew : t.suggestWhyLow}
      </p>
      <Failure error={make.error} />
      <div className="flex flex-wrap items-center gap-x-5 gap-y-2">
        <Button onClick={begin} disabled={make.isPending}>
          {t.start}
        </Button>
        <ButtonLink look="plain" to={chooseAt}>
          {t.chooseOwn}
        </ButtonLink>
      </div>
    </>
  );
}
