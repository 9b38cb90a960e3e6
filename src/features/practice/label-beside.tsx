import { useStore } from '@nanostores/react';
import { useEffect, useRef, useState } from 'react';
import type { LabelView } from '../../../shared/contracts/label.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { LabelPanel } from '../../ui/label-panel.tsx';

/** The share of the label on the screen from which it counts as seen: its rates stand above its middle. */
const mostOfIt = 0.75;

/** The label as a sheet that slides over the page, opened from a bar above the phone's bottom bar. */
function LabelSheet({ label }: { label: LabelView }) {
  const t = useStore(practiceMessages);
  const sheet = useRef<HTMLDialogElement>(null);
  return (
    <>
      <div className="fixed inset-x-0 bottom-[calc(2.8rem+env(safe-area-inset-bottom))] z-10 border-t border-rule bg-tank px-4 py-1 text-right">
        <Button look="plain" onClick={() => sheet.current?.showModal()}>
          {t.showLabel}
        </Button>
      </div>
      <dialog
        ref={sheet}
        aria-label={t.label}
        className="fixed inset-x-0 top-auto bottom-0 m-0 max-h-[85vh] w-full max-w-none flex-col bg-tank p-3 text-ink backdrop:bg-black/50 open:flex"
        {...{ closedby: 'any' }}
      >
        {/* What scrolls takes the focus first: the label opens at its top, and arrow keys move it. */}
        {/* oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex, jsx-a11y/prefer-tag-over-role */}
        <div role="group" aria-label={label.name} tabIndex={0} className="min-h-0 overflow-y-auto -outline-offset-2">
          <LabelPanel label={label} />
        </div>
        <Button className="mt-3 w-full flex-none" onClick={() => sheet.current?.close()}>
          {t.closeLabel}
        </Button>
      </dialog>
    </>
  );
}

/** On phones the label stands above the parts, folded at a press; once most of it is scrolled away it is one press from the answer. */
export function LabelOnPhone({ label, floating }: { label: LabelView; floating: boolean }) {
  const t = useStore(practiceMessages);
  const panel = useRef<HTMLDetailsElement>(null);
  const [isSeen, setSeen] = useState(true);
  useEffect(() => {
    if (!panel.current) return undefined;
    const watch = new IntersectionObserver((entries) => setSeen((entries.at(-1)?.intersectionRatio ?? 1) >= mostOfIt), {
      threshold: [0, mostOfIt],
    });
    watch.observe(panel.current);
    return () => watch.disconnect();
  }, []);
  return (
    <div className="mb-4 wide:hidden">
      <details ref={panel} open className="group">
        <summary className="mb-1 inline-flex min-h-11 items-center font-semibold text-dye underline underline-offset-4">
          {t.label}: {label.name}
        </summary>
        <LabelPanel label={label} />
      </details>
      {floating && !isSeen && <LabelSheet label={label} />}
    </div>
  );
}
