import { useStore } from '@nanostores/react';
import { useRef } from 'react';
import { SampleWork } from '../../features/practice/sample-work.tsx';
import { welcomeMessages } from '../../i18n/welcome.ts';
import { useMe } from '../../lib/session.ts';
import { paths } from '../../paths.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useDocumentTitle } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

function Columns({ parts }: { parts: readonly (readonly [title: string, text: string])[] }) {
  return (
    <div className="grid wide:grid-cols-3">
      {parts.map(([title, text]) => (
        <div
          key={title}
          className="border-t border-rule py-4 first:border-t-0 wide:border-t-0 wide:border-l wide:px-6 wide:first:border-l-0 wide:first:pl-0"
        >
          <h3 className="text-xl">{title}</h3>
          <p className="mt-1.5 max-w-prose">{text}</p>
        </div>
      ))}
    </div>
  );
}

/** What this is and for whom, with a problem to work at once. */
export default function Welcome() {
  const t = useStore(welcomeMessages);
  const me = useMe();
  const sample = useRef<HTMLElement>(null);
  const workNow = () => {
    const sheet = sample.current;
    if (!sheet) return;
    sheet.scrollIntoView({ block: 'start' });
    // A phone's keypad would cover the problem before it is read: there the heading takes the focus.
    const fits = sheet.getBoundingClientRect().height <= window.innerHeight;
    sheet.querySelector<HTMLElement>(fits ? 'input' : 'h2')?.focus({ preventScroll: true });
  };
  useDocumentTitle(t.documentTitle);
  return (
    <>
      <div className="grid items-start gap-8 pb-8 wide:grid-cols-[minmax(0,1fr)_minmax(0,1.05fr)] wide:gap-14 wide:pt-6">
        <div>
          <h1 className="text-[2.5rem] leading-[1.08] wide:text-[3.4rem]">{t.headline}</h1>
          <p className="mt-4 max-w-[32rem] font-serif text-lg wide:text-xl">{t.lead}</p>
          <div className="mt-6 flex flex-wrap gap-3">
            {me ? (
              <ButtonLink to={paths.today}>{t.toToday}</ButtonLink>
            ) : (
              <>
                <Button onClick={workNow}>{t.workNow}</Button>
                <ButtonLink to={paths.signUp} look="quiet">
                  {t.create}
                </ButtonLink>
              </>
            )}
          </div>
        </div>
        <Sheet ref={sample} graduated aria-labelledby="sample" className="scroll-mt-4">
          <h2 id="sample" tabIndex={-1} data-quiet-focus="">
            {t.sampleTitle}
          </h2>
          <p className="mb-3 text-sm text-ink-soft">{t.sampleHelp}</p>
          <SampleWork />
        </Sheet>
      </div>
      <section className="border-t-2 border-ink pt-2" aria-labelledby="what">
        <h2 id="what" className="sr-only">
          {t.what}
        </h2>
        <Columns
          parts={[
            [t.learn, t.learnText],
            [t.work, t.workText],
            [t.know, t.knowText],
          ]}
        />
      </section>
      <section className="mt-4 border-t border-rule pt-5" aria-labelledby="whom">
        <h2 id="whom" className="mb-1">
          {t.forWhom}
        </h2>
        <Columns
          parts={[
            [t.trainees, t.traineesText],
            [t.alone, t.aloneText],
            [t.families, t.familiesText],
          ]}
        />
      </section>
      <Notice tone="caution" className="mt-6 max-w-[52rem] text-sm">
        {t.standing}
      </Notice>
    </>
  );
}
