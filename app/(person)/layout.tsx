import type { ReactNode } from 'react';
import { redirect } from 'next/navigation';
import { TopBar } from '@/components/account/top-bar';
import { findViewer, mayReadRecord } from '@/lib/access';
import { findPerson } from '@/lib/account/person';

/** For whoever is signed in, also those who belong to no workshop any more. */
export default async function PersonLayout({ children }: { children: ReactNode }) {
  const person = await findPerson();
  if (!person) redirect('/sign-in');
  const viewer = await findViewer();
  return (
    <div className="flex min-h-dvh flex-col">
      <TopBar
        person={person.name}
        workshop={viewer && { id: viewer.workshopId, name: viewer.workshopName }}
        workshops={person.workshops}
        readsRecord={viewer !== null && mayReadRecord(viewer.role)}
      />
      {children}
    </div>
  );
}
