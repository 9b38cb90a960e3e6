import 'katex/dist/katex.min.css';
import type { WorkingLineView } from '../../shared/contracts/practice.ts';

/** A worked solution: one line, one reason. The formulas come rendered from our own server. */
export function WorkingLines({ lines }: { lines: readonly WorkingLineView[] }) {
  return (
    <ol className="list-none">
      {lines.map((line, index) => (
        <li key={index} className="border-t border-rule py-2.5 first:border-t-0">
          {line.html === '' ? (
            <p className="font-semibold">{line.plain}</p>
          ) : (
            <div
              className={`working overflow-x-auto overflow-y-hidden py-1 ${line.answers ? 'font-bold' : ''}`}
              tabIndex={0}
              role="group"
              aria-label={line.plain}
              dangerouslySetInnerHTML={{ __html: line.html }}
            />
          )}
          {line.reason !== '' && <p className="text-sm text-ink-soft">{line.reason}</p>}
        </li>
      ))}
    </ol>
  );
}
