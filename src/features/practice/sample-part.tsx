import { useStore } from '@nanostores/react';
import { useEffect, useRef, useState, type FormEvent } from 'react';
import type { PartView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { VerdictPanel } from '../../ui/verdict.tsx';
import { NumberField } from './number-field.tsx';
import { useSampleAnswer, type SampleId } from './sample-queries.ts';

type NumberPart = Extract<PartView, { kind: 'number' }>;

/** One part of a sample: graded by the server like any other, kept nowhere. */
export function SamplePart({ sample, part, lettered }: { sample: SampleId; part: NumberPart; lettered: boolean }) {
  const t = useStore(practiceMessages);
  const [value, setValue] = useState('');
  const [unit, setUnit] = useState(part.units[0]?.key ?? '');
  const answer = useSampleAnswer(sample);
  const verdict = useRef<HTMLDivElement>(null);
  const attempt = answer.data?.attempt ?? null;
  useEffect(() => {
    if (attempt) verdict.current?.focus();
  }, [attempt]);
  const check = (event: FormEvent) => {
    event.preventDefault();
    answer.mutate({ part: part.key, response: { kind: 'number', text: value, unit } });
  };
  return (
    <form onSubmit={check} noValidate className="border-t border-rule py-3 first:border-t-0">
      <p className="flex gap-2.5 font-semibold">
        {lettered && <span>{t.part({ part: part.key })}</span>}
        <span>{part.ask}</span>
      </p>
      <NumberField
        part={part.key}
        value={value}
        onChange={setValue}
        units={part.units}
        unit={unit}
        onUnit={setUnit}
        error={answer.data?.unreadable?.message ?? null}
        disabled={answer.isPending}
      >
        <Button type="submit" disabled={answer.isPending}>
          {lettered ? t.check({ part: part.key }) : t.checkOne}
        </Button>
      </NumberField>
      <Failure error={answer.error} className="mt-2" />
      <div aria-live="polite">{attempt && <VerdictPanel attempt={attempt} ref={verdict} />}</div>
    </form>
  );
}
