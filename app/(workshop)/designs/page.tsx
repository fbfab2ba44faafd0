import type { Metadata } from 'next';
import { DesignsList } from '@/components/designs/designs-list';
import { sectionParameters } from '@/geometry';
import { mayEdit, requirePageMember } from '@/lib/access';
import { listDesigns } from '@/lib/queries';

export const metadata: Metadata = { title: 'Designs' };

const lawLabels = Object.fromEntries(
  sectionParameters.law.options.map(({ value, label }) => [value, label]),
);

export default async function DesignsPage() {
  const viewer = await requirePageMember();
  return (
    <DesignsList
      initial={await listDesigns(viewer)}
      lawLabels={lawLabels}
      mayEdit={mayEdit(viewer.role)}
    />
  );
}
