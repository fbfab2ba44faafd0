import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { AccountScreen } from '@/components/account/account-screen';
import { findViewer } from '@/lib/access';
import { findPerson } from '@/lib/account/person';

export const metadata: Metadata = { title: 'Your account' };

export default async function AccountPage() {
  const person = await findPerson();
  if (!person) redirect('/sign-in');
  const { name, email, workshops } = person;
  return (
    <AccountScreen
      name={name}
      email={email}
      workshops={workshops}
      here={(await findViewer())?.workshopId ?? null}
    />
  );
}
