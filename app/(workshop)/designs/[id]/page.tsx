import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DesignScreen } from '@/components/design/design-screen';
import { requirePageMember } from '@/lib/access';
import { designName, designPage } from '@/lib/design-page';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const name = await designName(await requirePageMember(), (await params).id);
  return { title: name ?? 'Nothing here' };
}

export default async function DesignPage({ params }: Props) {
  const viewer = await requirePageMember();
  const page = await designPage(viewer, (await params).id);
  if (!page) notFound();
  return <DesignScreen key={page.record.id} {...page} userId={viewer.userId} />;
}
