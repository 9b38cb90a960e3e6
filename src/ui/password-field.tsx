import { useState, type ComponentProps } from 'react';
import { Field } from './field.tsx';

/** A password with a switch to show it: typing blind on a phone is where sign-ins fail. */
export function PasswordField({ show, ...field }: ComponentProps<typeof Field> & { show: string }) {
  const [shown, setShown] = useState(false);
  return (
    <div>
      <Field {...field} type={shown ? 'text' : 'password'} autoCapitalize="none" spellCheck={false} />
      <label className="mt-1 inline-flex min-h-8 items-center gap-2 text-sm">
        <input type="checkbox" className="size-4.5 accent-dye" checked={shown} onChange={() => setShown(!shown)} />
        {show}
      </label>
    </div>
  );
}
