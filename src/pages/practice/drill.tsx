import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { useNavigate, useParams } from 'react-router';
import { DrillEnd } from '../../features/practice/drill-end.tsx';
import { DrillScale } from '../../features/practice/drill-scale.tsx';
import { drillQuery, useNextProblem } from '../../features/practice/queries.ts';
import { drillMessages } from '../../i18n/drills.ts';
import { topicMessages } from '../../i18n/words.ts';
import { paths } from '../../paths.ts';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';

/** A drill's own address: goes on to the problem in hand, or shows how it went. */
export default function Drill() {
  const t = useStore(drillMessages);
  const topics = useStore(topicMessages);
  const navigate = useNavigate();
  const { drillId = '' } = useParams();
  const { data: drill, error } = useQuery(drillQuery(drillId));
  const next = useNextProblem(drillId);
  const asked = useRef(false);
  const isOpen = drill?.state === 'open';
  useEffect(() => {
    if (!isOpen || asked.current) return;
    asked.current = true;
    next.mutate(undefined, { onSuccess: (problem) => void navigate(paths.problem(problem.id), { replace: true }) });
  }, [isOpen, next, navigate]);
  if (error) throw error;
  if (next.error) throw next.error;
  if (!drill || isOpen) return <Loading />;
  return (
    <>
      <PageHeading title={t.drillTitle({ topics: drill.topics.map((topic) => topics[topic]).join(', ') })} />
      <DrillScale drill={drill} shownId={null} linkTo={paths.problem} />
      <DrillEnd drill={drill} chooseAt={paths.drills} onMade={(id) => void navigate(paths.drill(id))} />
    </>
  );
}
