import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router';
import { OpenLesson } from '../../features/lessons/open-lesson.tsx';
import { lessonsQuery } from '../../features/lessons/queries.ts';
import { OpenDrill } from '../../features/practice/open-drill.tsx';
import { drillsQuery, levelsQuery } from '../../features/practice/queries.ts';
import { SuggestedDrill } from '../../features/practice/suggested-drill.tsx';
import { TopicTubes } from '../../features/practice/topic-tubes.tsx';
import { todayMessages } from '../../i18n/today.ts';
import { useMe } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

const noon = 12;
const evening = 18;

function useGreeting(): string {
  const t = useStore(todayMessages);
  const name = useMe()?.name.split(' ')[0] ?? '';
  const [hour] = useState(() => new Date().getHours());
  if (hour < noon) return t.morning({ name });
  return hour < evening ? t.afternoon({ name }) : t.evening({ name });
}

/** What to do now, and where one stands. */
export default function Today() {
  const t = useStore(todayMessages);
  const greeting = useGreeting();
  const navigate = useNavigate();
  const levels = useQuery(levelsQuery);
  const drills = useQuery(drillsQuery);
  const lessons = useQuery(lessonsQuery).data ?? [];
  if (levels.error) throw levels.error;
  if (!levels.data || !drills.data) return <Loading />;
  const first = lessons.find((lesson) => lesson.topic === 'area') ?? lessons[0];
  const isNew = levels.data.every((level) => level.answers === 0);
  return (
    <>
      <PageHeading title={greeting} />
      <Sheet graduated>
        <OpenDrill drills={drills.data} linkTo={paths.drill} />
        <OpenLesson lessons={lessons} linkTo={({ topic, slug }) => paths.lesson(topic, slug)} />
        {isNew && (
          <div className="mb-6 border-b border-rule pb-5">
            <h2>{t.firstTitle}</h2>
            <p className="mt-2 mb-3 max-w-[36rem] font-serif">{t.firstText}</p>
            <ButtonLink look="quiet" to={first ? paths.lesson(first.topic, first.slug) : paths.course}>
              {t.firstLesson}
            </ButtonLink>
          </div>
        )}
        <SuggestedDrill levels={levels.data} chooseAt={paths.drills} onMade={(id) => void navigate(paths.drill(id))} />
      </Sheet>
      <h2 className="mt-8">{t.topicsTitle}</h2>
      <p className="mt-1 mb-4 max-w-prose text-sm text-ink-soft">{t.topicsHelp}</p>
      <TopicTubes levels={levels.data} />
    </>
  );
}
