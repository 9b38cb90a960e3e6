import 'katex/dist/katex.min.css';
import type { WorkingLineView } from '../../shared/contracts/practice.ts';
import { ScrollBox } from './scroll-box.tsx';

/** A worked solution: one line, one reason. The formulas come rendered from our own server. */
export function WorkingLines({ lines }: { lines: readonly WorkingLineView[] }) {
  return (
    <ol className="list-none">
      {lines.map(({ html, plain, reason, answers }) => (
        <li key={`${plain} ${reason}`} className="border-t border-rule py-2.5 first:border-t-0">
          {html === '' ? (
            <p className="font-semibold">{plain}</p>
          ) : (
            <ScrollBox label={plain} className={`py-1 ${answers ? 'font-bold' : ''}`}>
              <div className="working" dangerouslySetInnerHTML={{ __html: html }} />
            </ScrollBox>
          )}
          {reason !== '' && <p className="text-sm text-ink-soft">{reason}</p>}
        </li>
      ))}
    </ol>
  );
}
