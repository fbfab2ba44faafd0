import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CompareScreen } from '@/components/revisions/compare-screen';
import { likelyPair, titleOfState } from '@/components/revisions/state-pair';
import { requirePageMember } from '@/lib/access';
import { findDesign } from '@/lib/queries';
import { historyOf, stateOf } from '@/lib/revisions/queries';

interface Props {
  params: Promise<{ id: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export const metadata: Metadata = { title: 'Compare two states' };

const word = (asked: string | string[] | undefined, otherwise: string): string =>
  typeof asked === 'string' ? asked : otherwise;

export default async function ComparePage({ params, searchParams }: Props) {
  const viewer = await requirePageMember();
  const { id } = await params;
  const record = await findDesign(viewer, id);
  const history = record && (await historyOf(viewer, id));
  if (!history) notFound();
  const asked = await searchParams;
  const likely = likelyPair(history);
  const pair = { a: word(asked.a, likely.a), b: word(asked.b, likely.b) };
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
