import type { Metadata } from 'next';
import { OrdersScreen } from '@/components/orders/orders-screen';
import { mayOrder, requirePageMember } from '@/lib/access';
import { listOrders } from '@/lib/orders/order-queries';

export const metadata: Metadata = { title: 'Cut orders' };

export default async function OrdersPage() {
  const viewer = await requirePageMember();
  return (
    <OrdersScreen
      initial={await listOrders(viewer)}
      me={viewer.userId}
      mayOrder={mayOrder(viewer.role)}
    />
  );
}
