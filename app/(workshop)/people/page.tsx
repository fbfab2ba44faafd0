import type { Metadata } from 'next';
import { PeopleScreen } from '@/components/people/people-screen';
import { mayManagePeople, requirePageMember } from '@/lib/access';
import { listPeople } from '@/lib/people/list-people';

export const metadata: Metadata = { title: 'People' };

export default async function PeoplePage() {
  const viewer = await requirePageMember();
  return (
    <PeopleScreen
      initial={await listPeople(viewer)}
      me={viewer.userId}
      manages={mayManagePeople(viewer.role)}
    />
  );
}
