import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { OrderScreen } from '@/components/orders/order-screen';
import { requirePageMember } from '@/lib/access';
import { findOrder } from '@/lib/orders/order-queries';

type Props = { params: Promise<{ id: string }> };

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const order = await findOrder(await requirePageMember(), (await params).id);
  return { title: order ? `Order ${order.number}` : 'Nothing here' };
}

export default async function OrderPage({ params }: Props) {
  const order = await findOrder(await requirePageMember(), (await params).id);
  if (!order) notFound();
  return <OrderScreen key={order.id} initial={order} />;
}
