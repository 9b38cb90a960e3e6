import { useStore } from '@nanostores/react';
import { useState, type FormEvent } from 'react';
import type { LevelView, NewDrillBody } from '../../../shared/contracts/practice.ts';
import type { Topic } from '../../../shared/vocabulary.ts';
import { drillMessages } from '../../i18n/drills.ts';
import { topicMessages } from '../../i18n/words.ts';
import { Button } from '../../ui/button.tsx';
import { Failure } from '../../ui/failure.tsx';
import { useNewDrill } from './queries.ts';

const lengths = [5, 10, 20] as const;
const tiers = ['rising', 1, 2, 3] as const;

function Choice(props: {
  kind: 'radio' | 'checkbox';
  name: string;
  text: string;
  checked: boolean;
  onChange: () => void;
}) {
  const { kind, name, text, checked, onChange } = props;
  return (
    <label
      className={`flex min-h-11 items-center gap-2.5 border-[1.5px] px-3 py-1.5 ${checked ? 'border-dye bg-dye-wash' : 'border-rule-strong bg-sheet'}`}
    >
      <input type={kind} name={name} checked={checked} onChange={onChange} className="size-5 flex-none accent-dye" />
      {text}
    </label>
  );
}

interface DrillFormProps {
  levels: readonly LevelView[];
  /** Topics already chosen when one comes here from elsewhere. */
  chosen: readonly string[];
  onMade: (drillId: string) => void;
}

/** What a drill is made of: topics, tier and length. */
export function DrillForm({ levels, chosen, onMade }: DrillFormProps) {
  const t = useStore(drillMessages);
  const names = useStore(topicMessages);
  const make = useNewDrill();
  const [topics, setTopics] = useState<Topic[]>(() =>
    levels.filter(({ topic, tiers }) => tiers.length > 0 && chosen.includes(topic)).map(({ topic }) => topic),
  );
  const [tier, setTier] = useState<NewDrillBody['tier']>('rising');
  const [length, setLength] = useState<NewDrillBody['length']>(10);
  const [missing, setMissing] = useState(false);
  const drillable = levels.filter((level) => level.tiers.length > 0).map((level) => level.topic);
  const toCome = levels.filter((level) => level.tiers.length === 0).map((level) => names[level.topic]);
  const all = topics.length === drillable.length;
  const tierNames = { rising: t.rising, 1: t.tier1, 2: t.tier2, 3: t.tier3 } as const;
  const toggle = (topic: Topic) => {
    setMissing(false);
    setTopics(topics.includes(topic) ? topics.filter((one) => one !== topic) : [...topics, topic]);
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (topics.length === 0) setMissing(true);
    else make.mutate({ topics, tier, length }, { onSuccess: (drill) => onMade(drill.id) });
  };
  return (
    <form onSubmit={submit} noValidate>
      <fieldset className="mb-5" aria-describedby={missing ? 'no-topic' : undefined}>
        <legend className="mb-2 font-serif text-lg font-semibold">{t.topics}</legend>
        <div className="grid gap-2 sm:grid-cols-2 wide:grid-cols-3">
          <Choice
            kind="checkbox"
            name="topics"
            text={t.allNumbers}
            checked={all}
            onChange={() => setTopics(all ? [] : drillable)}
          />
          {drillable.map((topic) => (
            <Choice
              key={topic}
              kind="checkbox"
              name="topics"
              text={names[topic]}
              checked={topics.includes(topic)}
              onChange={() => toggle(topic)}
            />
          ))}
        </div>
        {toCome.length > 0 && <p className="mt-2 text-sm text-ink-soft">{t.toCome({ topics: toCome.join(', ') })}</p>}
        {missing && (
          <p id="no-topic" role="alert" className="mt-2 font-semibold text-clay">
            {t.noneChosen}
          </p>
        )}
      </fieldset>
      <fieldset className="mb-5">
        <legend className="mb-2 font-serif text-lg font-semibold">{t.tier}</legend>
        <div className="grid gap-2 sm:grid-cols-2">
          {tiers.map((one) => (
            <Choice
              key={one}
              kind="radio"
              name="tier"
              text={tierNames[one]}
              checked={tier === one}
              onChange={() => setTier(one)}
            />
          ))}
        </div>
      </fieldset>
      <fieldset className="mb-5">
        <legend className="mb-2 font-serif text-lg font-semibold">{t.length}</legend>
        <div className="flex gap-2">
          {lengths.map((one) => (
            <Choice
              key={one}
              kind="radio"
              name="length"
              text={String(one)}
              checked={length === one}
              onChange={() => setLength(one)}
            />
          ))}
        </div>
      </fieldset>
      <Failure error={make.error} />
      <Button type="submit" disabled={make.isPending}>
        {t.start}
      </Button>
    </form>
  );
}
