import { useStore } from '@nanostores/react';
import type { PartView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';

type ChoiceView = Extract<PartView, { kind: 'choice' }>;

/** Choice of one, as a list of large radio cards; once closed, each option with its reason. */
export function ChoiceField(props: {
  part: ChoiceView;
  value: string;
  onChange: (value: string) => void;
  disabled: boolean;
}) {
  const t = useStore(practiceMessages);
  const { part, value, onChange, disabled } = props;
  const closed = part.state === 'closed';
  return (
    <fieldset className="mt-2 max-w-[44rem]" disabled={disabled}>
      <legend className="sr-only">{`${part.ask} ${t.chooseOne}`}</legend>
      {part.options.map((option) => {
        const chosen = value === option.key;
        const look = option.right
          ? 'border-turf bg-turf-wash'
          : chosen && !closed
            ? 'border-dye bg-dye-wash'
            : 'border-rule-strong bg-sheet';
        return (
          <label
            key={option.key}
            className={`mb-2 flex min-h-12 items-start gap-3 border-[1.5px] px-3.5 py-2.5 ${look}`}
          >
            <input
              type="radio"
              name={`choice-${part.key}`}
              className="mt-1 size-5 flex-none accent-dye"
              checked={chosen}
              onChange={() => onChange(option.key)}
            />
            <span>
              {option.text}
              {closed && chosen && <b> ({t.yourChoice})</b>}
              {option.right && <b> ({t.theRightOne})</b>}
              {option.reason !== null && <span className="block text-sm text-ink-soft">{option.reason}</span>}
            </span>
          </label>
        );
      })}
    </fieldset>
  );
}
