import { Picture } from '@/components/design/cut-part';
import type { OrderPart } from '@/lib/schemas/order';
import { OrderFile } from './order-file';

/** One part to cut: its files and how it looks first, then how often. */
export function OrderPartItem({
  part,
  revision,
  quantity,
  stopped,
}: {
  part: OrderPart;
  /** Its id. */
  revision: string;
  /** Capacitors ordered. */
  quantity: number;
  /** Must not be cut: there is nothing to download. */
  stopped: boolean;
}) {
  const { picture } = part;
  const pieces = part.quantity * quantity;
  return (
    <li className="flex flex-col gap-2 border-b border-line py-4 first:pt-1 last:border-0">
      <h3 className="text-lead leading-tight">{part.label}</h3>
      <p>
        <strong>
          {pieces} {pieces === 1 ? 'piece' : 'pieces'}
        </strong>
        {quantity > 1 && `: ${part.quantity} × ${quantity}`}, each {picture.width.toFixed(1)} ×{' '}
        {picture.height.toFixed(1)} mm
      </p>
      <div className="flex gap-2">
        <Picture part={part} />
        {!stopped && (
          <div className="flex w-32 shrink-0 flex-col justify-center gap-2 *:min-h-12 *:grow-0">
            {part.files.map((file) => (
              <OrderFile key={file.name} revision={revision} file={file} />
            ))}
          </div>
        )}
      </div>
      {part.note && <p>{part.note}.</p>}
    </li>
  );
}
