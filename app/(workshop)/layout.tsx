import type { ReactNode } from 'react';
import { TopBar } from '@/components/account/top-bar';
import { Providers } from '@/components/providers';
import { requirePageMember } from '@/lib/access';

export default async function WorkshopLayout({ children }: { children: ReactNode }) {
  const viewer = await requirePageMember();
  return (
    <div className="flex min-h-dvh flex-col">
      <TopBar workshop={viewer.workshopName} person={viewer.name} />
      <Providers>{children}</Providers>
    </div>
  );
}
