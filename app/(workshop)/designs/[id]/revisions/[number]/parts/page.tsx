import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Cautions } from '@/components/design/cautions';
import { PartsTable } from '@/components/parts/parts-table';
import { partsOf } from '@/geometry/parts/assembly';
import { requirePageMember } from '@/lib/access';
import { derivationOf, findRevisionByNumber } from '@/lib/revisions/queries';

type Props = { params: Promise<{ id: string; number: string }> };

export const metadata: Metadata = { title: 'Parts of a revision' };

export default async function RevisionPartsPage({ params }: Props) {
  const viewer = await requirePageMember();
  const { id, number } = await params;
  const revision = await findRevisionByNumber(viewer, id, Number(number));
  const frozen = revision && (await derivationOf(viewer, revision.id));
  if (!frozen?.derivation.ok) notFound();
  const { derived } = frozen.derivation;
  return (
    <main id="main" className="mx-auto flex w-full max-w-6xl flex-col gap-4 px-5 py-5">
      <h1 className="wide-letter text-title font-semibold">
        Parts of {revision!.designName}, revision {revision!.number}
      </h1>
      <p>
        <Link href={`/designs/${id}/revisions/${number}`}>Back to the revision</Link>
      </p>
      <PartsTable parts={partsOf(derived)} depth={derived.stack.depth} />
      <Cautions />
    </main>
  );
}
