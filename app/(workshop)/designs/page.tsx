import type { Metadata } from 'next';
import { DesignsList } from '@/components/designs/designs-list';
import { mayEdit, requirePageMember } from '@/lib/access';
import { listDesigns } from '@/lib/queries';

export const metadata: Metadata = { title: 'Designs' };

export default async function DesignsPage() {
  const viewer = await requirePageMember();
  return <DesignsList initial={await listDesigns(viewer)} mayEdit={mayEdit(viewer.role)} />;
}
