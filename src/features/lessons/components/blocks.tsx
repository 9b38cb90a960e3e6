import { useStore } from '@nanostores/react';
import { useId, type ReactNode } from 'react';
import type { Figure as Drawing } from '../../../../shared/contracts/figure.ts';
import type { LabelView } from '../../../../shared/contracts/label.ts';
import { ProblemFigure } from '../../../figures/problem-figure.tsx';
import { lessonPartMessages } from '../../../i18n/lesson-parts.ts';
import { DataTable } from '../../../ui/data-table.tsx';
import { LabelPanel } from '../../../ui/label-panel.tsx';
import { Sheet } from '../../../ui/sheet.tsx';

// Text inside a box is no direct child of the lesson, so its paragraphs and lists are spaced here.
const text =
  '[&_p]:my-2 [&_ol]:my-2 [&_ol]:list-decimal [&_ol]:pl-[1.6em] [&_ul]:my-2 [&_ul]:list-disc [&_ul]:pl-[1.4em]';

function Box({ title, look, children }: { title: string; look: string; children: ReactNode }) {
  const heading = useId();
  return (
    <section aria-labelledby={heading} className={`my-7 px-4 py-3.5 wide:px-5 ${look} ${text}`}>
      <h2 id={heading} className="text-[1.1rem]">
        {title}
      </h2>
      {children}
    </section>
  );
}

interface FigureProps {
  caption: string;
  of?: Drawing;
  children?: ReactNode;
  /** Text equivalent of a child, one press away for everyone; what is given as data brings its own. */
  inWords?: string;
}

/**
 * A drawing in a lesson, on a sheet: one of the shared kinds given as data, or drawn for this lesson and given as a child.
 * What the reader can change brings its own sheet, which then is the figure's.
 */
export function Figure({ of, caption, children, inWords }: FigureProps) {
  const t = useStore(lessonPartMessages);
  const under = <figcaption className="mt-2 max-w-[36rem] text-[0.95rem] leading-snug">{caption}</figcaption>;
  return (
    <div className="my-6 border border-rule bg-sheet px-4 py-4 font-sans wide:px-6 [&>figure]:my-0">
      {of ? (
        <ProblemFigure figure={of} describe={t.describe} caption={under} />
      ) : (
        <figure>
          {children}
          {under}
          {inWords !== undefined && (
            <details className="no-print mt-1 text-sm text-ink-soft">
              <summary className="inline-flex min-h-6 items-center underline underline-offset-4">{t.describe}</summary>
              <p className="mt-1 max-w-prose">{inWords}</p>
            </details>
          )}
        </figure>
      )}
    </div>
  );
}

/** One problem worked from what is known to the answer and its check; `on` tells a second one of a lesson from the first. */
export function WorkedExample({ on, children }: { on?: string; children: ReactNode }) {
  const t = useStore(lessonPartMessages);
  const title = on === undefined ? t.worked : `${t.worked}: ${on}`;
  return (
    <Box title={title} look="border border-t-2 border-rule border-t-dye bg-sheet">
      {children}
    </Box>
  );
}

/** What to do on the job, at the close of a lesson. */
export function AtTheTank({ children }: { children: ReactNode }) {
  const t = useStore(lessonPartMessages);
  return (
    <Box title={t.tank} look="border-l-4 border-brass bg-brass-wash font-sans">
      {children}
    </Box>
  );
}

/** Where work can hurt. */
export function Caution({ children }: { children: ReactNode }) {
  const t = useStore(lessonPartMessages);
  return (
    <Box title={t.caution} look="border-l-4 border-clay bg-clay-wash font-sans">
      {children}
    </Box>
  );
}

/** Steps in order; its child is a numbered list. */
export function Steps({ children }: { children: ReactNode }) {
  return <div className={`my-5 max-w-[40rem] border-y border-rule py-1 font-sans ${text}`}>{children}</div>;
}

/** A sheet on which the reader changes something and sees what follows. */
export function TryIt({ title, children }: { title: string; children: ReactNode }) {
  const heading = useId();
  return (
    <Sheet aria-labelledby={heading} className="my-7 font-sans in-[figure]:my-0 in-[figure]:border-0 in-[figure]:p-0!">
      <h2 id={heading} className="mb-3 font-sans text-base tracking-normal">
        {title}
      </h2>
      {children}
    </Sheet>
  );
}

interface CompareProps {
  caption: string;
  head: readonly string[];
  rows: readonly (readonly string[])[];
}

/** Things side by side: a table whose first column heads its rows. */
export function Compare({ caption, head, rows }: CompareProps) {
  const columns = head.map((name, index) => ({
    key: name,
    head: name,
    cell: (row: readonly string[]) => row[index] ?? '',
  }));
  return (
    <div className="my-6 font-sans text-base leading-snug">
      <DataTable caption={caption} captionShown columns={columns} rows={rows} rowKey={(row) => String(row[0])} />
    </div>
  );
}

/** A practice label as a problem would show it. */
export function PracticeLabel({ label }: { label: LabelView }) {
  return (
    <div className="my-6 max-w-[28rem] font-sans">
      <LabelPanel label={label} />
    </div>
  );
}
