import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { ProblemFigure } from '../../figures/problem-figure.tsx';
import { useLocale } from '../../i18n/i18n.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { welcomeMessages } from '../../i18n/welcome.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { LabelPanel } from '../../ui/label-panel.tsx';
import { Loading } from '../../ui/loading.tsx';
import { SamplePart } from './sample-part.tsx';
import { sampleIds, sampleQuery } from './sample-queries.ts';

/** A problem anyone may work, drawn and graded as the real ones are. */
export function SampleWork() {
  const t = useStore(welcomeMessages);
  const practice = useStore(practiceMessages);
  const locale = useLocale();
  const [place, setPlace] = useState(0);
  const sample = sampleIds[place % sampleIds.length] ?? sampleIds[0];
  const { data: problem, error } = useQuery(sampleQuery(sample, locale));
  if (error) return <Failure error={error} />;
  if (!problem) return <Loading />;
  return (
    <div key={sample}>
      <p className="font-serif text-[1.1rem]">{problem.statement}</p>
      {problem.figure && <ProblemFigure figure={problem.figure} describe={practice.describe} />}
      {problem.label && (
        <div className="my-3 max-w-md">
          <LabelPanel label={problem.label} />
        </div>
      )}
      {problem.parts.map((part) =>
        part.kind === 'number' ? (
          <SamplePart key={`${sample}${part.key}`} sample={sample} part={part} lettered={problem.parts.length > 1} />
        ) : null,
      )}
      <Button look="plain" onClick={() => setPlace(place + 1)}>
        {t.another}
      </Button>
    </div>
  );
}
