import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { MailScreen } from '@/components/people/mail-screen';
import { mayManagePeople, requirePageMember } from '@/lib/access';
import { listMails } from '@/lib/mail/list-mails';

export const metadata: Metadata = { title: 'Mail sent' };

export default async function MailPage() {
  const viewer = await requirePageMember();
  if (!mayManagePeople(viewer.role)) notFound();
  return <MailScreen initial={await listMails(viewer)} />;
}
