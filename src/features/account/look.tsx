import { useStore } from '@nanostores/react';
import { useState } from 'react';
import { accountMessages } from '../../i18n/account.ts';
import { chooseScheme, chosenScheme, schemes } from '../../lib/scheme.ts';

/** Light, dark, or as the device is set. */
export function Look() {
  const t = useStore(accountMessages);
  const [chosen, setChosen] = useState(chosenScheme);
  const names = { system: t.lookSystem, light: t.lookLight, dark: t.lookDark };
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">{t.look}</legend>
      <p className="mb-2 text-sm text-ink-soft">{t.lookHelp}</p>
      <div className="flex flex-wrap gap-x-6">
        {schemes.map((scheme) => (
          <label key={scheme} className="inline-flex min-h-11 items-center gap-2.5">
            <input
              type="radio"
              name="look"
              className="size-5 accent-dye"
              checked={chosen === scheme}
              onChange={() => {
                chooseScheme(scheme);
                setChosen(scheme);
              }}
            />
            {names[scheme]}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
