import { useId, type ComponentProps, type ReactNode } from 'react';

interface Wiring {
  label: string;
  /** What to know before typing. */
  help?: string | undefined;
  error?: string | undefined;
}

const box =
  'min-h-11 w-full max-w-md rounded-[3px] border-[1.5px] bg-sheet px-3 py-2 text-ink aria-[invalid=true]:border-clay border-rule-strong';

function describedBy(id: string, { help, error }: Wiring): string | undefined {
  return [help && `${id}-help`, error && `${id}-error`].filter(Boolean).join(' ') || undefined;
}

function Around({ id, wiring, children }: { id: string; wiring: Wiring; children: ReactNode }) {
  const { label, help, error } = wiring;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      {help && (
        <p id={`${id}-help`} className="mb-1 text-sm text-ink-soft">
          {help}
        </p>
      )}
      {children}
      {error && (
        <p id={`${id}-error`} className="mt-1 text-sm font-semibold text-clay">
          {error}
        </p>
      )}
    </div>
  );
}

/** A text field with its label, its help and its error tied to it. */
export function Field({ label, help, error, className = '', ...input }: ComponentProps<'input'> & Wiring) {
  const id = useId();
  const wiring = { label, help, error };
  return (
    <Around id={id} wiring={wiring}>
      <input
        {...input}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, wiring)}
        className={`${box} ${className}`}
      />
    </Around>
  );
}

/** A choice from a list, wired the same way. */
export function SelectField({ label, help, error, children, ...select }: ComponentProps<'select'> & Wiring) {
  const id = useId();
  const wiring = { label, help, error };
  return (
    <Around id={id} wiring={wiring}>
      <select
        {...select}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, wiring)}
        className={box}
      >
        {children}
      </select>
    </Around>
  );
}
