import { useStore } from '@nanostores/react';
import type { ProofSample } from '../../../shared/contracts/families.ts';
import { ProblemFigure } from '../../figures/problem-figure.tsx';
import { staffMessages } from '../../i18n/staff.ts';
import { DataTable } from '../../ui/data-table.tsx';
import { LabelPanel } from '../../ui/label-panel.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { WorkingLines } from '../../ui/working-lines.tsx';

type Part = ProofSample['parts'][number];

/** The timed-set form of a part: each wrong option with the slip it comes from. */
function Choices({ part }: { part: Part }) {
  const t = useStore(staffMessages);
  return (
    <div>
      <h4 className="font-semibold">{t.choicesOf({ part: part.key })}</h4>
      <ul className="list-disc pl-5">
        {part.options.map((option) => (
          <li key={option.text} className={option.right ? 'font-semibold text-turf' : ''}>
            {option.text}
            {option.right
              ? ` (${t.rightOne})`
              : option.slip !== null && <span className="text-ink-soft"> · {option.slip}</span>}
            {option.reason !== null && <span className="block text-sm text-ink-soft">{option.reason}</span>}
          </li>
        ))}
      </ul>
    </div>
  );
}

function Slips({ sample }: { sample: ProofSample }) {
  const t = useStore(staffMessages);
  const { tier, seed, slips } = sample;
  if (slips.length === 0) return <p className="text-ink-soft">{t.noSlips}</p>;
  return (
    <DataTable
      caption={t.slipTable({ tier, seed })}
      rows={slips}
      rowKey={({ key, part, answer }) => `${part} ${key} ${answer}`}
      columns={[
        { key: 'slip', head: t.slip, cell: ({ key }) => key },
        { key: 'part', head: t.part, cell: ({ part }) => `(${part})` },
        { key: 'gives', head: t.gives, number: true, cell: ({ answer }) => answer },
        { key: 'says', head: t.says, cell: ({ message }) => roomy(message) },
      ]}
    />
  );
}

function roomy(text: string) {
  return <span className="block min-w-56">{text}</span>;
}

function unbroken(text: string) {
  return <span className="whitespace-nowrap">{text}</span>;
}

/** One drawn problem with everything its author must check: what is asked, what is right, what each slip gives and says. */
export function ProofSampleSheet({ sample }: { sample: ProofSample }) {
  const t = useStore(staffMessages);
  const { tier, seed, figure, label, parts } = sample;
  const offered = parts.filter((part) => part.options.length > 0);
  return (
    <Sheet graduated className="mb-6" aria-label={t.sample({ tier, seed })}>
      <p className="text-sm text-ink-soft">{t.sample({ tier, seed })}</p>
      <h2>{sample.heading}</h2>
      <p className="my-3 max-w-[38rem] font-serif text-[1.1rem]">{sample.statement}</p>
      <div className={label ? 'grid gap-x-6 wide:grid-cols-[minmax(0,1fr)_20rem]' : ''}>
        <div className="min-w-0">
          {figure && <ProblemFigure figure={figure} describe={t.describe} />}
          <h3 className="mt-4 mb-1">{t.answers}</h3>
          <DataTable
            caption={t.answerTable({ tier, seed })}
            rows={parts}
            rowKey={({ key }) => key}
            columns={[
              { key: 'ask', head: t.ask, cell: ({ key, ask }) => `(${key}) ${ask}` },
              { key: 'answer', head: t.answer, cell: ({ answer }) => unbroken(answer) },
            ]}
          />
        </div>
        {label && (
          <div className="mt-4">
            <LabelPanel label={label} />
          </div>
        )}
      </div>
      <h3 className="mt-6 mb-1">{t.slips}</h3>
      <Slips sample={sample} />
      {offered.length > 0 && (
        <>
          <h3 className="mt-6 mb-1">{t.choices}</h3>
          <div className="grid gap-4 wide:grid-cols-2">
            {offered.map((part) => (
              <Choices key={part.key} part={part} />
            ))}
          </div>
        </>
      )}
      <h3 className="mt-6 mb-1">{t.hints}</h3>
      <ol className="list-decimal pl-5">
        {sample.hints.map((hint) => (
          <li key={hint}>{hint}</li>
        ))}
      </ol>
      <h3 className="mt-6 mb-1">{t.working}</h3>
      <WorkingLines lines={sample.working} />
    </Sheet>
  );
}
