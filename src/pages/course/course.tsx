import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { CourseList } from '../../features/lessons/course-list.tsx';
import { lessonsQuery } from '../../features/lessons/queries.ts';
import { levelsQuery } from '../../features/practice/queries.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { paths } from '../../paths.ts';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';

/** The eighteen modules with their lessons. */
export default function Course() {
  const t = useStore(lessonMessages);
  const { data: lessons, error } = useQuery(lessonsQuery);
  const levels = useQuery(levelsQuery).data ?? [];
  if (error && !lessons) throw error;
  if (!lessons) return <Loading />;
  return (
    <div className="max-w-[52rem]">
      <PageHeading title={t.courseTitle}>
        <p className="mt-2 max-w-prose font-serif">{t.courseIntro}</p>
      </PageHeading>
      <CourseList
        lessons={lessons}
        drillable={levels.filter((level) => level.tiers.length > 0).map((level) => level.topic)}
        lessonAt={({ topic, slug }) => paths.lesson(topic, slug)}
        drillAt={paths.drillsOn}
      />
    </div>
  );
}
