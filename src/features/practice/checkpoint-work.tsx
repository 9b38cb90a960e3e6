import { useStore } from '@nanostores/react';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import type { ProblemView } from '../../../shared/contracts/practice.ts';
import type { Tier } from '../../../shared/vocabulary.ts';
import { lessonMessages } from '../../i18n/lessons.ts';
import { api } from '../../lib/api.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { Loading } from '../../ui/loading.tsx';
import { ProblemWork } from './problem-work.tsx';
import { problemQuery } from './queries.ts';

interface CheckpointWorkProps {
  lesson: string;
  checkpoint: string;
  family: string;
  tier: Tier;
  /** Every part of its problem is closed. */
  onDone: (checkpoint: string) => void;
}

/** The problem of a lesson's checkpoint: the one the reader has, or a new one. */
export function CheckpointWork({ lesson, checkpoint, family, tier, onDone }: CheckpointWorkProps) {
  const t = useStore(lessonMessages);
  const client = useQueryClient();
  const draw = (fresh: boolean) =>
    api<ProblemView>('POST', `/api/lessons/${lesson}/checkpoints/${checkpoint}`, { family, tier, fresh });
  const key = ['checkpoint', lesson, checkpoint];
  const first = useQuery({
    queryKey: key,
    queryFn: async () => {
      const problem = await draw(false);
      client.setQueryData(problemQuery(problem.id).queryKey, problem);
      return problem.id;
    },
    staleTime: Infinity,
  });
  const problem = useQuery({ ...problemQuery(first.data ?? ''), enabled: first.data !== undefined }).data;
  const another = useMutation({
    mutationFn: () => draw(true),
    onSuccess: (fresh) => {
      client.setQueryData(problemQuery(fresh.id).queryKey, fresh);
      client.setQueryData(key, fresh.id);
    },
  });
  const isDone = problem?.state === 'done';
  useEffect(() => {
    if (isDone) onDone(checkpoint);
  }, [isDone, checkpoint, onDone]);
  if (first.error) return <Failure error={first.error} />;
  if (first.data === undefined) return <Loading />;
  return (
    <ProblemWork
      problemId={first.data}
      compact
      after={
        <>
          <Failure error={another.error} />
          <Button look="plain" disabled={another.isPending} onClick={() => another.mutate()}>
            {t.another}
          </Button>
        </>
      }
    />
  );
}
