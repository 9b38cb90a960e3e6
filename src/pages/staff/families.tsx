import { useStore } from '@nanostores/react';
import { useQuery } from '@tanstack/react-query';
import { FamilyTable } from '../../features/families/family-table.tsx';
import { familiesQuery } from '../../features/families/queries.ts';
import { staffMessages } from '../../i18n/staff.ts';
import { paths } from '../../paths.ts';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';
import { Sheet } from '../../ui/sheet.tsx';

/** The families of problems, for those who write them. */
export default function Families() {
  const t = useStore(staffMessages);
  const { data: families, error } = useQuery(familiesQuery);
  if (error) throw error;
  if (!families) return <Loading />;
  return (
    <>
      <PageHeading title={t.title}>
        <p className="mt-2 max-w-prose font-serif">{t.intro}</p>
      </PageHeading>
      <Sheet>
        <FamilyTable families={families} linkTo={paths.family} />
      </Sheet>
    </>
  );
}
