import type { OrderSummary } from '@/lib/schemas/order';
import { OrderFile } from './order-file';

/** What the machine opens for one order, straight from the queue. */
export function QueueFiles({ order: { revision, files } }: { order: OrderSummary }) {
  if (files.length === 0) return <span className="text-ink-2">none to cut from</span>;
  return (
    <span className="flex flex-wrap gap-1.5 py-1">
      {files.map((file) => (
        <OrderFile key={file.name} revision={revision.id} file={file} words={file.label} />
      ))}
    </span>
  );
}
