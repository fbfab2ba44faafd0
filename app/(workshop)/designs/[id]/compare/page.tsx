import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CompareScreen } from '@/components/revisions/compare-screen';
import { likelyPair, titleOfState } from '@/components/revisions/state-pair';
import { requirePageMember } from '@/lib/access';
import { findDesign } from '@/lib/queries';
import { historyOf, stateOf } from '@/lib/revisions/queries';
import type { History } from '@/lib/schemas/revision';

interface Props {
  params: Promise<{ id: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export const metadata: Metadata = { title: 'Compare two states' };

/** The state that is asked for; the version that is saved goes by one name. */
function asState(
  asked: string | string[] | undefined,
  otherwise: string,
  { versions }: History,
): string {
  if (typeof asked !== 'string') return otherwise;
  return asked === `v${versions[0]?.version}` ? 'draft' : asked;
}

export default async function ComparePage({ params, searchParams }: Props) {
  const viewer = await requirePageMember();
  const { id } = await params;
  const record = await findDesign(viewer, id);
  const history = record && (await historyOf(viewer, id));
  if (!history) notFound();
  const asked = await searchParams;
  const likely = likelyPair(history);
  const pair = {
    a: asState(asked.a, likely.a, history),
    b: asState(asked.b, likely.b, history),
  };
  const [a, b] = await Promise.all([stateOf(viewer, id, pair.a), stateOf(viewer, id, pair.b)]);
  if (!a || !b) notFound();
  return (
    <CompareScreen
      key={`${pair.a} ${pair.b}`}
      designId={id}
      name={record.name}
      history={history}
      pair={pair}
      states={[
        { ...a, title: titleOfState(pair.a) },
        { ...b, title: titleOfState(pair.b) },
      ]}
    />
  );
}
