import type { OrderSummary } from '@/lib/schemas/order';
import { OrderFile } from './order-file';

/** What follows the name counts the pieces of one capacitor, not of the order. */
const partOf = (label: string): string => label.split(':')[0]!;

/** What the machine opens for one order, straight from the queue. */
export function QueueFiles({ order: { revision, files } }: { order: OrderSummary }) {
  if (files.length === 0) return <span className="text-ink-2">none to cut from</span>;
  return (
    <span className="flex flex-wrap gap-1.5 py-1">
      {files.map((file) => (
        <OrderFile
          key={file.name}
          revision={revision.id}
          file={file}
          words={partOf(file.label)}
        />
      ))}
    </span>
  );
}
