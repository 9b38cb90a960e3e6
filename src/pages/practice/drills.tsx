import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router';
import { DrillForm } from '../../features/practice/drill-form.tsx';
import { drillsQuery, levelsQuery } from '../../features/practice/queries.ts';
import { RecentDrills } from '../../features/practice/recent-drills.tsx';
import { drillMessages } from '../../i18n/drills.ts';
import { shellMessages } from '../../i18n/shell.ts';
import { paths } from '../../paths.ts';
import { Loading } from '../../ui/loading.tsx';
import { Notice } from '../../ui/notice.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

export default function Drills() {
  const t = useStore(drillMessages);
  const shell = useStore(shellMessages);
  const navigate = useNavigate();
  const chosen = useSearchParams()[0].getAll('topic');
  const levels = useQuery(levelsQuery);
  const drills = useQuery(drillsQuery);
  const error = levels.error ?? drills.error;
  if (error) throw error;
  if (!levels.data || !drills.data) return <Loading />;
  return (
    <>
      <PageHeading title={t.title}>
        <p className="mt-2 max-w-prose font-serif">{t.intro}</p>
      </PageHeading>
      <Sheet>
        <DrillForm levels={levels.data} chosen={chosen} onMade={(id) => void navigate(paths.drill(id))} />
      </Sheet>
      <Notice tone="caution" className="mt-4 text-sm">
        {shell.caution}
      </Notice>
      <h2 className="mt-8 mb-2">{t.recent}</h2>
      <RecentDrills drills={drills.data} linkTo={paths.drill} />
    </>
  );
}
