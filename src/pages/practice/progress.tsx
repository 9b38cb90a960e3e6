import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { DayBars } from '../../features/practice/day-bars.tsx';
import { LevelTable } from '../../features/practice/level-table.tsx';
import { progressQuery } from '../../features/practice/queries.ts';
import { SlipTable } from '../../features/practice/slip-table.tsx';
import { progressMessages } from '../../i18n/progress.ts';
import { paths } from '../../paths.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

export default function Progress() {
  const t = useStore(progressMessages);
  const { data, error } = useQuery(progressQuery);
  if (error) throw error;
  if (!data) return <Loading />;
  if (data.answered === 0) {
    return (
      <>
        <PageHeading title={t.title} />
        <p className="mb-4 max-w-prose font-serif">{t.empty}</p>
        <ButtonLink to={paths.drills}>{t.toDrills}</ButtonLink>
      </>
    );
  }
  const { answered, right, seconds } = data;
  return (
    <>
      <PageHeading title={t.title}>
        <p className="mt-2 font-serif">{t.totals({ right, answered, minutes: Math.round(seconds / 60) })}</p>
      </PageHeading>
      <Sheet className="mb-6">
        <h2 className="mb-3">{t.levels}</h2>
        <LevelTable levels={data.levels} />
      </Sheet>
      <Sheet className="mb-6">
        <h2 className="mb-3">{t.days}</h2>
        <DayBars days={data.days} />
      </Sheet>
      <Sheet>
        <h2 className="mb-3">{t.slips}</h2>
        <SlipTable slips={data.slips} />
      </Sheet>
    </>
  );
}
