import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Cautions } from '@/components/design/cautions';
import { PartsTable } from '@/components/parts/parts-table';
import { partsOf } from '@/geometry/parts/assembly';
import { requirePageMember } from '@/lib/access';
import { describeFailure } from '@/lib/kernel/assessment';
import { designName, designPage } from '@/lib/design-page';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const name = await designName(await requirePageMember(), (await params).id);
  return { title: name === null ? 'Nothing here' : `Parts of ${name}` };
}

export default async function PartsPage({ params }: Props) {
  const viewer = await requirePageMember();
  const page = await designPage(viewer, (await params).id);
  if (!page) notFound();
  const { record, derivation, revision } = page;
  return (
    <main id="main" className="mx-auto flex w-full max-w-6xl flex-col gap-4 px-5 py-5">
      <h1 className="wide-letter text-title font-semibold">Parts of {record.name}</h1>
      <p>
        <Link href={`/designs/${record.id}`}>Back to the design</Link>,{' '}
        {revision ? `revision ${revision.number}` : `saved version ${record.version}`}
      </p>
      {derivation.ok ? (
        <PartsTable
          parts={partsOf(derivation.derived)}
          depth={derivation.derived.stack.depth}
        />
      ) : (
        <ul className="text-bad">
          {derivation.findings.map((finding) => (
            <li key={finding.label}>{describeFailure(finding)}</li>
          ))}
        </ul>
      )}
      <Cautions />
    </main>
  );
}
