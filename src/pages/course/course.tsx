import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { ModuleBlock } from '../../features/lessons/module-block.tsx';
import { modulesOf, nextLesson } from '../../features/lessons/modules.ts';
import { lessonsQuery } from '../../features/lessons/queries.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { paths } from '../../paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';

/** The eighteen modules with their lessons. */
export default function Course() {
  const t = useStore(lessonMessages);
  const { data: lessons, error } = useQuery(lessonsQuery);
  if (error && !lessons) throw error;
  if (!lessons) return <Loading />;
  const next = nextLesson(lessons);
  const begun = lessons.some((lesson) => lesson.progress?.startedAt);
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
      <div className="grid max-w-[52rem] gap-3">
        {modulesOf(lessons).map((module) => (
          <ModuleBlock
            key={module.topic}
            module={module}
            linkTo={(lesson) => paths.lesson(lesson.topic, lesson.slug)}
          />
        ))}
      </div>
    </>
  );
}
