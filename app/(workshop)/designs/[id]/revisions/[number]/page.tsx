import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { RevisionScreen } from '@/components/revisions/revision-screen';
import { mayEdit, mayOrder, mayRelease, mayWaive, requirePageMember } from '@/lib/access';
import { derivationOf, findRevisionByNumber, revisionFiles } from '@/lib/revisions/queries';

type Props = { params: Promise<{ id: string; number: string }> };

async function revisionOf({ params }: Props) {
  const viewer = await requirePageMember();
  const { id, number } = await params;
  return { viewer, revision: await findRevisionByNumber(viewer, id, Number(number)) };
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const { revision } = await revisionOf(props);
  return {
    title: revision ? `${revision.designName}, revision ${revision.number}` : 'Nothing here',
  };
}

export default async function RevisionPage(props: Props) {
  const { viewer, revision } = await revisionOf(props);
  const frozen = revision && (await derivationOf(viewer, revision.id));
  if (!frozen) notFound();
  const { role } = viewer;
  const edit = mayEdit(role);
  const inUse = revision.state !== 'withdrawn' && (edit || revision.state === 'released');
  return (
    <RevisionScreen
      key={revision.id}
      revision={revision}
      {...frozen}
      files={inUse ? await revisionFiles(viewer, revision.id) : null}
      may={{ edit, release: mayRelease(role), waive: mayWaive(role), order: mayOrder(role) }}
    />
  );
}
