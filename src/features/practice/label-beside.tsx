import { useStore } from '@nanostores/react';
import { useRef } from 'react';
import type { LabelView } from '../../../shared/contracts/label.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { Button } from '../../ui/button.tsx';
import { LabelPanel } from '../../ui/label-panel.tsx';

/** On phones the label stands above the parts, folded at a press, and slides over the page while one answers. */
export function LabelOnPhone({ label, floating }: { label: LabelView; floating: boolean }) {
  const t = useStore(practiceMessages);
  const sheet = useRef<HTMLDialogElement>(null);
  return (
    <div className="mb-4 wide:hidden">
      <details open className="group">
        <summary className="mb-1 inline-flex min-h-11 items-center font-semibold text-dye underline underline-offset-4">
          {t.label}: {label.name}
        </summary>
        <LabelPanel label={label} />
      </details>
      {floating && (
        <div className="fixed right-3 bottom-[4.75rem] z-10">
          <Button look="quiet" className="bg-sheet! shadow-md" onClick={() => sheet.current?.showModal()}>
            {t.showLabel}
          </Button>
        </div>
      )}
      <dialog
        ref={sheet}
        aria-label={t.label}
        className="fixed inset-x-0 top-auto bottom-0 m-0 max-h-[85vh] w-full max-w-none overflow-y-auto bg-tank p-3 text-ink backdrop:bg-black/50"
        {...{ closedby: 'any' }}
      >
        <LabelPanel label={label} />
        <Button className="mt-3 w-full" onClick={() => sheet.current?.close()}>
          {t.closeLabel}
        </Button>
      </dialog>
    </div>
  );
}
