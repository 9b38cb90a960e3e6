import { useStore } from '@nanostores/react';
import { useId } from 'react';
import type { ProgressView } from '../../../shared/contracts/practice.ts';
import { useFormat } from '../../i18n/i18n.ts';
import { progressMessages } from '../../i18n/progress.ts';
import { DataTable } from '../../ui/data-table.tsx';

type Day = ProgressView['days'][number];

const width = 640;
const height = 122;
const floor = 121;

/** Noon, so that a date never slips to its neighbor in the reader's zone. */
function dateOf(day: Day): Date {
  return new Date(`${day.date}T12:00:00`);
}

/** First answers a day as bars, the right ones filled, with the table behind. */
export function DayBars({ days }: { days: readonly Day[] }) {
  const t = useStore(progressMessages);
  const { time, number } = useFormat();
  const shown = days.slice(-28);
  const most = Math.max(1, ...shown.map((day) => day.answered));
  const caption = useId();
  const step = width / Math.max(shown.length, 7);
  const tall = (value: number) => (value / most) * (floor - 16);
  const short = (day: Day) => time(dateOf(day), { day: 'numeric', month: 'short' });
  return (
    <figure>
      <svg viewBox={`0 0 ${width} ${height}`} role="img" aria-labelledby={caption} className="w-full max-w-[44rem]">
        <path d={`M0 ${floor}H${width}`} className="stroke-rule-strong" />
        {shown.map((day, index) => {
          const x = index * step + step * 0.18;
          const bar = step * 0.64;
          return (
            <g key={day.date}>
              <rect
                x={x}
                y={floor - tall(day.answered)}
                width={bar}
                height={tall(day.answered)}
                className="fill-dye-wash stroke-dye"
              />
              <rect x={x} y={floor - tall(day.right)} width={bar} height={tall(day.right)} className="fill-dye" />
            </g>
          );
        })}
      </svg>
      <div className="max-w-[44rem] text-sm text-ink-soft" aria-hidden="true">
        <p
          className="flex min-w-fit justify-between gap-2"
          style={{ width: `${(shown.length * step * 100) / width}%` }}
        >
          {[shown[0], shown.length > 1 ? shown.at(-1) : undefined].map(
            (day) => day && <span key={day.date}>{short(day)}</span>,
          )}
        </p>
      </div>
      <figcaption id={caption} className="mt-1 text-sm">
        {t.daysChart({ days: shown.length, most })}
      </figcaption>
      <details className="mt-2">
        <summary className="inline-flex min-h-6 items-center text-dye underline underline-offset-4">
          {t.showTable}
        </summary>
        <DataTable
          caption={t.days}
          rows={[...days].reverse()}
          rowKey={(day) => day.date}
          columns={[
            { key: 'day', head: t.day, cell: (day) => time(dateOf(day), { dateStyle: 'medium' }) },
            { key: 'answered', head: t.answered, number: true, cell: (day) => number(day.answered) },
            { key: 'right', head: t.right, number: true, cell: (day) => number(day.right) },
          ]}
        />
      </details>
    </figure>
  );
}
