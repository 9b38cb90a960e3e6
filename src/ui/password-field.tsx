import { useState, type ComponentProps } from 'react';
import { Field } from './field.tsx';

/** The switch that shows what is typed: typing blind on a phone is where sign-ins fail. */
export function ShowPassword(props: { text: string; shown: boolean; onChange: (shown: boolean) => void }) {
  return (
    <label className="mt-1 inline-flex min-h-8 items-center gap-2 text-sm">
      <input
        type="checkbox"
        className="size-4.5 accent-dye"
        checked={props.shown}
        onChange={() => props.onChange(!props.shown)}
      />
      {props.text}
    </label>
  );
}

/** A password with the switch to show it. */
export function PasswordField({ show, ...field }: ComponentProps<typeof Field> & { show: string }) {
  const [shown, setShown] = useState(false);
  return (
    <div>
      <Field {...field} type={shown ? 'text' : 'password'} autoCapitalize="none" spellCheck={false} />
      <ShowPassword text={show} shown={shown} onChange={setShown} />
    </div>
  );
}
