import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { HistoryScreen } from '@/components/revisions/history-screen';
import { requirePageMember } from '@/lib/access';
import { findDesign } from '@/lib/queries';
import { historyOf } from '@/lib/revisions/queries';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const record = await findDesign(await requirePageMember(), (await params).id);
  return { title: record ? `Revisions of ${record.name}` : 'Nothing here' };
}

export default async function RevisionsPage({ params }: Props) {
  const viewer = await requirePageMember();
  const record = await findDesign(viewer, (await params).id);
  const history = record && (await historyOf(viewer, record.id));
  if (!history) notFound();
  return (
    <HistoryScreen key={record.id} designId={record.id} name={record.name} initial={history} />
  );
}
