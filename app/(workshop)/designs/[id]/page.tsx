import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DesignScreen } from '@/components/design/design-screen';
import { deriveDesign } from '@/lib/kernel/kernel';
import { requirePageMember } from '@/lib/access';
import { listFiles } from '@/lib/design-files';
import { RequestError } from '@/lib/errors';
import { findDesign } from '@/lib/queries';

/** A design without plates has no files; its screen asks again and says why. */
function noFiles(error: unknown): null {
  if (error instanceof RequestError && error.code === 'checks-fail') return null;
  throw error;
}

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const record = await findDesign(await requirePageMember(), (await params).id);
  return { title: record?.name ?? 'Nothing here' };
}

export default async function DesignPage({ params }: Props) {
  const viewer = await requirePageMember();
  const record = await findDesign(viewer, (await params).id);
  if (!record) notFound();
  return (
    <DesignScreen
      key={record.id}
      record={record}
      derivation={await deriveDesign(record.design)}
      files={await listFiles(record.id).catch(noFiles)}
      userId={viewer.userId}
    />
  );
}
