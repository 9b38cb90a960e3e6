import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { CourseList } from '../../features/lessons/course-list.tsx';
import { nextLesson } from '../../features/lessons/modules.ts';
import { lessonsQuery } from '../../features/lessons/queries.ts';
import { levelsQuery } from '../../features/practice/queries.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { paths } from '../../paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';

/** The whole course. */
export default function Course() {
  const t = useStore(lessonMessages);
  const { data: lessons, error } = useQuery(lessonsQuery);
  const levels = useQuery(levelsQuery).data ?? [];
  if (error && !lessons) throw error;
  if (!lessons) return <Loading />;
  const next = nextLesson(lessons);
  const begun = lessons.some((lesson) => lesson.progress?.startedAt);
  const drillable = levels.filter((level) => level.tiers.length > 0).map((level) => level.topic);
  return (
    <>
      <PageHeading title={t.title}>
        <p className="mt-2 max-w-prose font-serif">{t.intro}</p>
        {next && (
          <ButtonLink to={paths.lesson(next.topic, next.slug)} className="mt-4">
            {begun ? t.goOn({ title: next.title }) : t.begin({ title: next.title })}
          </ButtonLink>
        )}
      </PageHeading>
      <div className="max-w-[52rem]">
        <CourseList
          lessons={lessons}
          drillable={drillable}
          lessonAt={({ topic, slug }) => paths.lesson(topic, slug)}
          drillAt={paths.drillsOn}
        />
      </div>
    </>
  );
}
