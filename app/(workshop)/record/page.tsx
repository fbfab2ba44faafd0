import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { RecordScreen } from '@/components/record/record-screen';
import { mayReadRecord, requirePageMember } from '@/lib/access';
import { recordPage, recordPeople } from '@/lib/record-queries';
import { recordWords } from '@/lib/record-words';

export const metadata: Metadata = { title: 'Record' };

export default async function RecordPage() {
  const viewer = await requirePageMember();
  if (!mayReadRecord(viewer.role)) notFound();
  return (
    <RecordScreen
      initial={await recordPage(viewer, {})}
      people={await recordPeople(viewer)}
      words={recordWords}
    />
  );
}
