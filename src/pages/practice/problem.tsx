import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router';
import { DrillScale } from '../../features/practice/drill-scale.tsx';
import { ProblemFooter } from '../../features/practice/problem-footer.tsx';
import { ProblemWork } from '../../features/practice/problem-work.tsx';
import { drillQuery, levelsQuery, problemQuery } from '../../features/practice/queries.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { topicMessages } from '../../i18n/words.ts';
import { paths } from '../../paths.ts';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';

function Progress({ drillId, problemId }: { drillId: string; problemId: string }) {
  const { data: drill } = useQuery(drillQuery(drillId));
  return drill ? <DrillScale drill={drill} shownId={problemId} linkTo={paths.problem} /> : null;
}

/** One problem on its own page: a reload or a shared bookmark comes back to the same one. */
export default function Problem() {
  const t = useStore(practiceMessages);
  const topics = useStore(topicMessages);
  const navigate = useNavigate();
  const { problemId = '' } = useParams();
  const { data: problem, error } = useQuery(problemQuery(problemId));
  const levels = useQuery(levelsQuery).data ?? [];
  if (error) throw error;
  if (!problem) return <Loading />;
  const { drill, tier } = problem;
  const topic = topics[problem.topic];
  const above = drill
    ? t.drillPlace({ topic, position: drill.position, length: drill.length, tier })
    : t.singlePlace({ topic, tier });
  const after = (
    <ProblemFooter
      problem={problem}
      levels={levels}
      onShow={(next) => void navigate(paths.problem(next.id))}
      onEnd={() => drill && void navigate(paths.drill(drill.id))}
    />
  );
  return (
    <div key={problem.id}>
      <PageHeading title={problem.heading} above={above} />
      {drill && <Progress drillId={drill.id} problemId={problem.id} />}
      <ProblemWork problemId={problem.id} after={after} />
    </div>
  );
}
