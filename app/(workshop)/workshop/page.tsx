import type { Metadata } from 'next';
import { ShopTable } from '@/components/shop/shop-table';
import { mayEdit, requirePageMember } from '@/lib/access';
import { listShopItems } from '@/lib/shop-items';

export const metadata: Metadata = { title: 'Machines and sheet' };

export default async function WorkshopPage() {
  const viewer = await requirePageMember();
  const edits = mayEdit(viewer.role);
  return (
    <main id="main" className="mx-auto flex w-full max-w-6xl flex-col gap-8 px-5 py-5">
      <h1 className="wide-letter text-title font-semibold">Machines and sheet</h1>
      <ShopTable
        kind="machines"
        initial={await listShopItems(viewer, 'machines')}
        mayEdit={edits}
      />
      <ShopTable
        kind="sheets"
        initial={await listShopItems(viewer, 'sheets')}
        mayEdit={edits}
      />
    </main>
  );
}
