import { useStore } from '@nanostores/react';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { Link, useParams, useSearchParams } from 'react-router';
import type { ProofSheet } from '../../../shared/contracts/families.ts';
import { tiers } from '../../../shared/vocabulary.ts';
import { DrawForm } from '../../features/families/draw-form.tsx';
import { ProofSampleSheet } from '../../features/families/proof-sample.tsx';
import { proofQuery, type Draw } from '../../features/families/queries.ts';
import { staffMessages } from '../../i18n/staff.ts';
import { topicMessages } from '../../i18n/words.ts';
import { paths } from '../../paths.ts';
import { Loading } from '../../ui/loading.tsx';
import { PageHeading } from '../../ui/page.tsx';

function drawOf(search: URLSearchParams): Draw {
  const count = Number(search.get('count'));
  return {
    tier: tiers.find((tier) => String(tier) === search.get('tier')) ?? null,
    seed: search.get('seed') || '1',
    count: Number.isInteger(count) && count >= 1 && count <= 20 ? count : 1,
  };
}

function Sources({ sources }: { sources: ProofSheet['sources'] }) {
  const t = useStore(staffMessages);
  return (
    <section className="text-sm text-ink-soft">
      <h2 className="text-base">{t.sources}</h2>
      {sources.length === 0 && <p>{t.noSource}</p>}
      <ul className="list-disc pl-5">
        {sources.map(({ title, publisher, year, ref }) => (
          <li key={title}>{[title, publisher, year ?? t.noYear, ref].filter((text) => text !== null).join(', ')}</li>
        ))}
      </ul>
    </section>
  );
}

/** A family's proof sheet: samples of each tier with answers, slips, choices and working. */
export default function FamilyPage() {
  const t = useStore(staffMessages);
  const topics = useStore(topicMessages);
  const { family: key = '' } = useParams();
  const [search, setSearch] = useSearchParams();
  const draw = drawOf(search);
  const { data: sheet, error } = useQuery({ ...proofQuery(key, draw), placeholderData: keepPreviousData });
  if (error) throw error;
  if (!sheet) return <Loading />;
  const { topic, title, version, tiers: offered } = sheet.family;
  const redraw = ({ tier, seed, count }: Draw) =>
    setSearch({ ...(tier === null ? {} : { tier: String(tier) }), seed, count: String(count) });
  return (
    <>
      <PageHeading title={title} above={t.place({ topic: topics[topic], key, version })}>
        <Link to={paths.families} className="no-print mt-1 inline-flex min-h-6 items-center text-sm">
          {t.back}
        </Link>
      </PageHeading>
      <DrawForm key={search.toString()} draw={draw} offered={offered} onDraw={redraw} />
      {sheet.samples.map((sample) => (
        <ProofSampleSheet key={`${sample.tier} ${sample.seed}`} sample={sample} />
      ))}
      <Sources sources={sheet.sources} />
    </>
  );
}
