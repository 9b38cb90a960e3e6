import { useStore } from '@nanostores/react';
import { useRef, useState } from 'react';
import type { PartView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';

type OrderView = Extract<PartView, { kind: 'order' }>;

/** The steps in the order the person has put them; unknown and missing keys are mended. */
export function orderedSteps(part: OrderView, keys: readonly string[]): OrderView['steps'] {
  const byKey = new Map(part.steps.map((step) => [step.key, step]));
  const kept = keys.flatMap((key) => byKey.get(key) ?? []);
  return kept.length === part.steps.length ? kept : part.steps;
}

function Arrow({ down }: { down: boolean }) {
  return (
    <svg
      width="18"
      height="18"
      viewBox="0 0 18 18"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
    >
      <path d={down ? 'M9 3v12M4 10l5 5 5-5' : 'M9 15V3M4 8l5-5 5 5'} />
    </svg>
  );
}

/** Putting steps in order: two buttons a step, so that it works by keyboard, by touch and by voice alike. */
export function OrderField(props: {
  part: OrderView;
  keys: readonly string[];
  onChange: (keys: string[]) => void;
  disabled: boolean;
}) {
  const t = useStore(practiceMessages);
  const [said, setSaid] = useState('');
  const list = useRef<HTMLOListElement>(null);
  const { part, disabled, onChange } = props;
  const steps = orderedSteps(part, props.keys);
  const move = (from: number, by: 1 | -1) => {
    const keys = steps.map((step) => step.key);
    const [moved] = keys.splice(from, 1);
    keys.splice(from + by, 0, moved as string);
    onChange(keys);
    setSaid(t.moved({ step: steps[from]?.text ?? '', place: from + by + 1, count: steps.length }));
    // The focus stays with the step that moved, or goes to its other button where it has come to an end.
    requestAnimationFrame(() => {
      const buttons = list.current?.querySelectorAll<HTMLButtonElement>(`[data-step="${moved}"] button:not(:disabled)`);
      (buttons?.[by === 1 ? buttons.length - 1 : 0] ?? null)?.focus();
    });
  };
  return (
    <div className="mt-2 max-w-[44rem]">
      <p className="mb-2 text-sm text-ink-soft">{t.order}</p>
      <ol ref={list} className="list-none">
        {steps.map((step, index) => (
          <li
            key={step.key}
            data-step={step.key}
            className="mb-1.5 flex items-center gap-2.5 border-[1.5px] border-rule-strong bg-sheet py-1.5 pr-1.5 pl-2"
          >
            <span className="w-4 flex-none text-right font-bold text-ink-soft tabular-nums">{index + 1}</span>
            <span className="mr-auto">{step.text}</span>
            {!disabled && (
              <span className="flex flex-none gap-1">
                <button
                  type="button"
                  aria-label={t.moveUp({ step: step.text })}
                  disabled={index === 0}
                  onClick={() => move(index, -1)}
                  className="grid size-11 place-items-center rounded-[3px] border border-rule-strong text-dye disabled:opacity-40"
                >
                  <Arrow down={false} />
                </button>
                <button
                  type="button"
                  aria-label={t.moveDown({ step: step.text })}
                  disabled={index === steps.length - 1}
                  onClick={() => move(index, 1)}
                  className="grid size-11 place-items-center rounded-[3px] border border-rule-strong text-dye disabled:opacity-40"
                >
                  <Arrow down />
                </button>
              </span>
            )}
          </li>
        ))}
      </ol>
      <output className="sr-only">{said}</output>
    </div>
  );
}
