import { useStore } from '@nanostores/react';
import type { ReactNode } from 'react';
import type { Figure as Drawing } from '../../../../shared/contracts/figure.ts';
import { ProblemFigure } from '../../../figures/problem-figure.tsx';
import { lessonPartMessages } from '../../../i18n/lesson-parts.ts';
import { ScrollBox } from '../../../ui/scroll-box.tsx';

/** A drawing in a lesson: a specification drawn to scale, or a drawing of its own as children. */
export function Figure({ of, caption, children }: { of?: Drawing; caption: string; children?: ReactNode }) {
  const t = useStore(lessonPartMessages);
  return (
    <figure className="not-prose my-6 font-sans">
      {of ? <ProblemFigure figure={of} describe={t.describe} /> : children}
      <figcaption className="mt-1 text-sm text-ink-soft">{caption}</figcaption>
    </figure>
  );
}

/** A worked example, framed; its sums are laid out line by line. */
export function WorkedExample({ children }: { children: ReactNode }) {
  const t = useStore(lessonPartMessages);
  return (
    <section className="my-6 border border-rule bg-sheet px-4 py-3 wide:px-5">
      <h2 className="mt-0">{t.worked}</h2>
      {children}
    </section>
  );
}

/** What to do on the job, at the close of a lesson. */
export function AtTheTank({ children }: { children: ReactNode }) {
  const t = useStore(lessonPartMessages);
  return (
    <section className="my-6 border-l-4 border-brass bg-brass-wash px-4 py-3 font-sans">
      <h2 className="mt-0">{t.tank}</h2>
      {children}
    </section>
  );
}

/** Where work can hurt. */
export function Caution({ children }: { children: ReactNode }) {
  const t = useStore(lessonPartMessages);
  return (
    <section className="my-6 border-l-4 border-clay bg-clay-wash px-4 py-3 font-sans">
      <h2 className="mt-0">{t.caution}</h2>
      {children}
    </section>
  );
}

/** Steps in order, numbered by the list inside. */
export function Steps({ children }: { children: ReactNode }) {
  return <div className="my-5 border-y border-rule py-1 font-sans">{children}</div>;
}

/** A figure to change by hand. */
export function TryIt({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="not-prose my-6 border border-rule bg-sheet px-4 py-4 font-sans wide:px-5">
      <h2 className="mb-3 text-[1.05rem]">{title}</h2>
      {children}
    </section>
  );
}

/** A side-by-side table. */
export function Compare({
  caption,
  head,
  rows,
}: {
  caption: string;
  head: readonly string[];
  rows: readonly (readonly string[])[];
}) {
  return (
    <ScrollBox label={caption} className="not-prose my-6 font-sans">
      <table className="w-full border-collapse text-left">
        <caption className="mb-1 text-left font-semibold">{caption}</caption>
        <thead>
          <tr>
            {head.map((text) => (
              <th key={text} scope="col" className="border-b border-rule px-2 py-1.5 text-sm text-ink-soft">
                {text}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(([first, ...rest]) => (
            <tr key={first}>
              <th scope="row" className="border-b border-rule px-2 py-1.5 align-top font-semibold">
                {first}
              </th>
              {rest.map((text) => (
                <td key={text} className="border-b border-rule px-2 py-1.5 align-top">
                  {text}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollBox>
  );
}
