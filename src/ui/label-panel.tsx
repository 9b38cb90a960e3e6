import type { LabelView } from '../../shared/contracts/label.ts';

/** A practice label: a black-ruled panel that says it is not real. In a narrow column its headings run in, as on a container. */
export function LabelPanel({ label }: { label: LabelView }) {
  return (
    <section
      aria-label={`${label.name}. ${label.notice}`}
      className="@container border-2 border-ink bg-sheet text-sm leading-snug"
    >
      <p className="bg-ink px-3 py-1 text-xs font-bold tracking-wide text-sheet">{label.notice}</p>
      <header className="flex flex-wrap items-baseline justify-between gap-x-3 border-b-2 border-ink px-3 py-2">
        <p className="font-serif text-xl leading-none font-bold">{label.name}</p>
        <p className="ml-auto text-right">
          {label.type}
          <span className="block text-xs text-ink-soft">{label.number}</span>
        </p>
      </header>
      <dl className="grid gap-x-3 gap-y-1 px-3 pt-2 pb-3 @min-[18rem]:grid-cols-[minmax(0,6.75rem)_1fr]">
        {label.rows.map(({ heading, text }) => (
          <div key={`${heading}${text}`} className="@min-[18rem]:contents">
            <dt className="inline font-bold after:content-[':_'] @min-[18rem]:after:content-none">{heading}</dt>
            <dd className="inline">{text}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
