import type { ReactNode } from 'react';
import { TopBar } from '@/components/account/top-bar';
import { Providers } from '@/components/providers';
import { mayReadRecord, requirePageMember } from '@/lib/access';
import { findPerson } from '@/lib/account/person';
import { latestChange } from '@/lib/live/latest-change';

export default async function WorkshopLayout({ children }: { children: ReactNode }) {
  const viewer = await requirePageMember();
  // Before the page reads: what comes after this is news to it.
  const since = await latestChange(viewer);
  const person = await findPerson();
  return (
    <div className="flex min-h-dvh flex-col">
      <TopBar
        person={viewer.name}
        workshop={{ id: viewer.workshopId, name: viewer.workshopName }}
        workshops={person?.workshops ?? []}
        readsRecord={mayReadRecord(viewer.role)}
      />
      <Providers since={since}>{children}</Providers>
    </div>
  );
}
