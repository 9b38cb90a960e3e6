import { useStore } from '@nanostores/react';
import { lazy, Suspense, useEffect, useRef, useState, type FormEvent } from 'react';
import type { LevelView, PartView, Response } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { ApiError } from '../../lib/api.ts';
import { Button } from '../../ui/button.tsx';
import { useFailureText } from '../../ui/failure.tsx';
import { Loading } from '../../ui/loading.tsx';
import { Attempts } from './attempts.tsx';
import { ChoiceField } from './choice-field.tsx';
import { useDraft } from './draft.ts';
import { LevelLine } from './level-line.tsx';
import { NumberField } from './number-field.tsx';
import { useAnswer } from './queries.ts';

// Few problems ask for an order: its field is fetched with them.
const OrderField = lazy(async () => ({ default: (await import('./order-field.tsx')).OrderField }));

/** Seconds since the part came in front of the person, or since the last answer to it. */
function useSeconds(): () => number {
  const since = useRef(0);
  useEffect(() => {
    since.current = Date.now();
  }, []);
  return () => {
    const seconds = Math.round((Date.now() - since.current) / 1000);
    since.current = Date.now();
    return Math.min(Math.max(seconds, 0), 3_600);
  };
}

function responseFor(part: PartView, value: string, unit: string): Response {
  if (part.kind === 'choice') return { kind: 'choice', option: value };
  if (part.kind === 'order')
    return { kind: 'order', steps: value === '' ? part.steps.map((step) => step.key) : value.split(' ') };
  return { kind: 'number', text: value, ...(part.kind === 'number' ? { unit } : {}) };
}

interface PartBlockProps {
  problemId: string;
  part: PartView;
  /** Several parts are lettered; a single one is not. */
  lettered: boolean;
  /** The letter of the part that comes first, while this one has to wait for it. */
  after: string | null;
}

/** One part: what is asked, the field, and what grading said of each answer. */
export function PartBlock({ problemId, part, lettered, after }: PartBlockProps) {
  const t = useStore(practiceMessages);
  const units = part.kind === 'number' ? part.units : [];
  const [value, keep, forget] = useDraft(`${problemId}.${part.key}`, '');
  const [unit, keepUnit] = useDraft(`${problemId}.${part.key}.unit`, units[0]?.key ?? '');
  const [waiting, setWaiting] = useState(false);
  const [level, setLevel] = useState<LevelView | null>(null);
  const [refused, setRefused] = useState<string | null>(null);
  const failureText = useFailureText();
  const seconds = useSeconds();
  const answer = useAnswer(problemId, setWaiting);
  const attempts = part.attempts.length;
  const closed = part.state === 'closed';

  const check = (event: FormEvent) => {
    event.preventDefault();
    if (answer.isPending || closed) return;
    if (after !== null) {
      setRefused(t.answerFirst({ part: after }));
      return;
    }
    setRefused(null);
    answer.mutate(
      { part: part.key, response: responseFor(part, value, unit), seconds: seconds() },
      {
        onSuccess: (reply) => {
          if (reply.unreadable) setRefused(reply.unreadable.message);
          else if (reply.parts.find((one) => one.key === part.key)?.state === 'closed') forget();
          if (reply.level) setLevel(reply.level);
        },
        onError: (error) =>
          setRefused(error instanceof ApiError && error.status !== 0 ? failureText(error) : t.couldNotSave),
      },
    );
  };
  const change = (next: string) => {
    keep(next);
    setRefused(null);
  };
  const button = closed ? null : (
    <Button type="submit" className="max-wide:px-3" disabled={answer.isPending}>
      {answer.isPending ? t.checking : lettered ? t.check({ part: part.key }) : t.checkOne}
    </Button>
  );
  return (
    <form onSubmit={check} noValidate className="border-t border-rule py-4 first:border-t-0">
      <p id={`ask-${problemId}-${part.key}`} className="flex gap-2.5 font-semibold">
        {lettered && <span>{t.part({ part: part.key })}</span>}
        <span>{part.ask}</span>
      </p>
      {(part.kind === 'number' || part.kind === 'count') && !closed && (
        <NumberField
          part={part.key}
          value={value}
          onChange={change}
          units={units}
          unit={unit}
          onUnit={keepUnit}
          {...(part.kind === 'count' ? { thing: part.thing } : {})}
          error={refused}
          disabled={answer.isPending}
        >
          {button}
        </NumberField>
      )}
      {part.kind === 'choice' && (
        <ChoiceField
          part={part}
          value={value || (part.attempts.at(-1)?.typed ?? '')}
          onChange={change}
          disabled={answer.isPending || closed}
        />
      )}
      {part.kind === 'order' && (
        <Suspense fallback={<Loading />}>
          <OrderField
            part={part}
            keys={closed ? [] : value.split(' ')}
            onChange={(keys) => change(keys.join(' '))}
            disabled={answer.isPending || closed}
          />
        </Suspense>
      )}
      {(part.kind === 'choice' || part.kind === 'order') && (
        <>
          {button}
          {refused !== null && (
            <p role="alert" className="mt-1.5 font-semibold text-clay">
              {refused}
            </p>
          )}
        </>
      )}
      {waiting && <output className="block mt-2 text-sm text-brass">{t.notSaved}</output>}
      <Attempts part={part} />
      {level && <LevelLine level={level} />}
      {attempts === 1 && !closed && <p className="mt-1.5 text-sm text-ink-soft">{t.firstCounts}</p>}
      {closed && part.answerText !== null && part.attempts.at(-1)?.verdict !== 'right' && (
        <p className="mt-2">{t.answer({ answer: part.answerText })}</p>
      )}
    </form>
  );
}
