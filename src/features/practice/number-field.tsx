import { useStore } from '@nanostores/react';
import { useId, useRef, type ReactNode } from 'react';
import { practiceMessages } from '../../i18n/practice.ts';

interface NumberFieldProps {
  part: string;
  value: string;
  onChange: (value: string) => void;
  units: readonly { key: string; symbol: string }[];
  unit: string;
  onUnit: (unit: string) => void;
  /** What stands after the field when there is no unit: the thing counted. */
  thing?: string;
  error: string | null;
  disabled: boolean;
  /** Beside the field: the check button. */
  children: ReactNode;
}

const fractionKeys = ['/', '½', '¼', '¾', ' '];

function SpaceSign() {
  return (
    <svg
      width="20"
      height="18"
      viewBox="0 0 20 18"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
    >
      <path d="M3 9v5h14V9" />
    </svg>
  );
}

/** One number with its unit. Phones show the decimal keypad; the signs it lacks stand beside. */
export function NumberField(props: NumberFieldProps) {
  const t = useStore(practiceMessages);
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const { part, value, onChange, units, unit, onUnit, thing, error, disabled } = props;
  const insert = (sign: string) => {
    const at = input.current?.selectionStart ?? value.length;
    const before = value.slice(0, at);
    const space = sign !== '/' && sign !== ' ' && /\d$/.test(before) ? ' ' : '';
    onChange(`${before}${space}${sign}${value.slice(at)}`);
    input.current?.focus();
  };
  return (
    <div className="mt-2">
      <div className="flex flex-wrap items-stretch gap-x-2 gap-y-2 wide:gap-x-3">
        <div
          className={`inline-flex overflow-hidden rounded-[3px] border-[1.5px] bg-sheet focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-dye ${error ? 'border-clay' : 'border-ink'}`}
        >
          <input
            ref={input}
            id={id}
            name={`answer-${part}`}
            aria-label={t.yourAnswer({ part })}
            aria-invalid={error !== null}
            aria-describedby={error === null ? undefined : `${id}-error`}
            className="w-20 bg-transparent px-2.5 wide:w-32 wide:px-3 py-2 text-lg font-semibold outline-none"
            inputMode="decimal"
            autoComplete="off"
            autoCorrect="off"
            spellCheck={false}
            maxLength={200}
            value={value}
            readOnly={disabled}
            onChange={(event) => onChange(event.target.value)}
          />
          {units.length > 1 && (
            <select
              aria-label={t.unit({ part })}
              className="border-l-[1.5px] border-ink bg-tank px-1 py-2 outline-none focus-visible:bg-dye-wash wide:px-2"
              value={unit}
              disabled={disabled}
              onChange={(event) => onUnit(event.target.value)}
            >
              {units.map(({ key, symbol }) => (
                <option key={key} value={key}>
                  {symbol}
                </option>
              ))}
            </select>
          )}
          {units.length === 1 && units[0]?.symbol !== '' && (
            <span className="border-l-[1.5px] border-ink bg-tank px-3 py-2">{units[0]?.symbol}</span>
          )}
          {thing !== undefined && <span className="border-l-[1.5px] border-ink bg-tank px-3 py-2">{thing}</span>}
        </div>
        {props.children}
      </div>
      <fieldset aria-label={t.keys} className="mt-1.5 flex gap-1.5 wide:hidden">
        {fractionKeys.map((sign) => (
          <button
            key={sign}
            type="button"
            disabled={disabled}
            aria-label={sign === ' ' ? t.space : undefined}
            onClick={() => insert(sign)}
            className="grid min-h-11 min-w-11 place-items-center rounded-[3px] border border-rule-strong bg-tank text-lg"
          >
            {sign === ' ' ? <SpaceSign /> : sign}
          </button>
        ))}
      </fieldset>
      {error !== null && (
        <p id={`${id}-error`} role="alert" className="mt-1.5 font-semibold text-clay">
          {error}
        </p>
      )}
    </div>
  );
}
