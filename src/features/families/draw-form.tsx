import { useStore } from '@nanostores/react';
import { useState, type FormEvent } from 'react';
import { tiers, type Tier } from '../../../shared/vocabulary.ts';
import { staffMessages } from '../../i18n/staff.ts';
import { Button } from '../../ui/button.tsx';
import { Field, SelectField } from '../../ui/field.tsx';
import type { Draw } from './queries.ts';

const counts = [1, 2, 3, 5, 10, 20];

/** Which samples to draw. */
export function DrawForm({
  draw,
  offered,
  onDraw,
}: {
  draw: Draw;
  offered: readonly Tier[];
  onDraw: (draw: Draw) => void;
}) {
  const t = useStore(staffMessages);
  const [tier, setTier] = useState(String(draw.tier ?? ''));
  const [seed, setSeed] = useState(draw.seed);
  const [count, setCount] = useState(String(draw.count));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const chosen = tiers.find((one) => String(one) === tier) ?? null;
    onDraw({ tier: chosen, seed: seed.trim() || '1', count: Number(count) });
  };
  return (
    <form onSubmit={submit} className="no-print mb-6 flex flex-wrap items-end gap-4">
      <SelectField label={t.tier} value={tier} onChange={(event) => setTier(event.target.value)}>
        <option value="">{t.everyTier}</option>
        {offered.map((one) => (
          <option key={one} value={one}>
            {one}
          </option>
        ))}
      </SelectField>
      <Field
        label={t.seed}
        value={seed}
        maxLength={50}
        autoComplete="off"
        onChange={(event) => setSeed(event.target.value)}
      />
      <SelectField label={t.count} value={count} onChange={(event) => setCount(event.target.value)}>
        {counts.map((one) => (
          <option key={one} value={one}>
            {one}
          </option>
        ))}
      </SelectField>
      <Button type="submit">{t.draw}</Button>
      <Button look="quiet" onClick={() => window.print()}>
        {t.print}
      </Button>
    </form>
  );
}
