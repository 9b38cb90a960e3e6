import { useStore } from '@nanostores/react';
import { useState } from 'react';
import { Link } from 'react-router';
import type { FamilySummary } from '../../../shared/contracts/families.ts';
import { staffMessages } from '../../i18n/staff.ts';
import { topicMessages } from '../../i18n/words.ts';
import { DataTable } from '../../ui/data-table.tsx';
import { Field } from '../../ui/field.tsx';

function nameCell({ about, title, to }: { about: string; title: string; to: string }) {
  return (
    <>
      <Link to={to} className="inline-flex min-h-6 items-center">
        {title}
      </Link>
      <span className="block text-sm font-normal text-ink-soft">{about}</span>
    </>
  );
}

/** Every family by topic, narrowed by a few letters of its name. */
export function FamilyTable({
  families,
  linkTo,
}: {
  families: readonly FamilySummary[];
  linkTo: (key: string) => string;
}) {
  const t = useStore(staffMessages);
  const topics = useStore(topicMessages);
  const [wanted, setWanted] = useState('');
  const letters = wanted.trim().toLowerCase();
  const shown = families.filter((family) =>
    `${family.key} ${family.title} ${topics[family.topic]}`.toLowerCase().includes(letters),
  );
  return (
    <>
      <Field label={t.find} type="search" value={wanted} onChange={(event) => setWanted(event.target.value)} />
      <output className="block mt-2 mb-3 text-sm text-ink-soft">
        {shown.length === 0 ? t.none : t.found(shown.length)}
      </output>
      <DataTable
        caption={t.table}
        rows={shown}
        rowKey={(family) => family.key}
        columns={[
          {
            key: 'family',
            head: t.family,
            cell: ({ key, title, topic }) => nameCell({ about: `${topics[topic]} · ${key}`, title, to: linkTo(key) }),
          },
          { key: 'tiers', head: t.tiers, number: true, cell: ({ tiers }) => tiers.join(', ') },
          { key: 'slips', head: t.slips, number: true, cell: ({ slips }) => slips },
          { key: 'version', head: t.version, number: true, cell: ({ version }) => version },
        ]}
      />
    </>
  );
}
