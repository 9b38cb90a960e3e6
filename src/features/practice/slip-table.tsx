import { useStore } from '@nanostores/react';
import type { SlipView } from '../../../shared/contracts/practice.ts';
import { useFormat } from '../../i18n/i18n.ts';
import { progressMessages } from '../../i18n/progress.ts';
import { DataTable } from '../../ui/data-table.tsx';

/** The slip, and on phones the kind of problem under it. */
function withKind(slip: SlipView) {
  return (
    <>
      {slip.headline}
      <span className="block text-sm font-normal text-ink-soft wide:hidden">{slip.familyTitle}</span>
    </>
  );
}

/** The mistakes made, most frequent first. */
export function SlipTable({ slips }: { slips: readonly SlipView[] }) {
  const t = useStore(progressMessages);
  const { time } = useFormat();
  if (slips.length === 0) return <p className="text-ink-soft">{t.noSlips}</p>;
  return (
    <DataTable
      caption={t.slips}
      rows={slips}
      rowKey={(slip) => `${slip.family}/${slip.slip}/${slip.topic}`}
      columns={[
        { key: 'slip', head: t.slip, cell: withKind },
        { key: 'kind', head: t.kind, wideOnly: true, cell: (slip) => slip.familyTitle },
        { key: 'times', head: t.times, number: true, cell: (slip) => t.timesCount(slip.times) },
        {
          key: 'last',
          head: t.last,
          number: true,
          cell: (slip) => time(new Date(slip.lastAt), { day: 'numeric', month: 'short' }),
        },
      ]}
    />
  );
}
