import { PanelSection } from '@/components/design/panel-section';
import { formatQuantity } from '@/geometry';
import type { Order } from '@/lib/schemas/order';
import { OrderFile } from './order-file';
import { OrderPartItem } from './order-part';

const millimetres = (value: unknown): string => formatQuantity(Number(value), 'length');

/** What is cut, from the files of exactly the revision that was ordered. */
export function OrderParts({ order, stopped }: { order: Order; stopped: boolean }) {
  const { revision, parts, quantity, sheets, sheet, machine } = order;
  return (
    <PanelSection title={stopped ? 'Parts that were ordered' : 'Files to cut from'}>
      {stopped ? (
        <p>No file is given out: this revision must not be cut.</p>
      ) : (
        <p>
          Of revision {revision.number}, {revision.name}, as it was released: in millimetres, at
          nominal size. From {sheets} × {sheet.name}, on {machine.name}, whose kerf of{' '}
          {millimetres(machine.values.kerf)} is not allowed for in them.
        </p>
      )}
      <ul aria-label="Parts to cut" className="flex flex-col">
        {parts.map((part) => (
          <OrderPartItem
            key={part.stem}
            part={part}
            revision={revision.id}
            quantity={quantity}
            stopped={stopped}
          />
        ))}
      </ul>
      {parts.length === 0 && (
        <p>No part of this revision is cut from the sheet that stands in the order.</p>
      )}
    </PanelSection>
  );
}

/** Parts that this order leaves out, and what goes with all of them. */
export function OtherFiles({ order, stopped }: { order: Order; stopped: boolean }) {
  const { revision, otherFiles, otherParts } = order;
  return (
    <>
      {otherParts.length > 0 && (
        <PanelSection title="Not in this order">
          <p>These want other sheet, hence an order of their own:</p>
          <ul className="list-disc pl-5">
            {otherParts.map(({ label, sheet }) => (
              <li key={label}>
                {label}: {sheet}
              </li>
            ))}
          </ul>
        </PanelSection>
      )}
      {!stopped && otherFiles.length > 0 && (
        <PanelSection title="Drawing, lists and all in one">
          <ul className="flex flex-col">
            {otherFiles.map((file) => (
              <li
                key={file.name}
                className="flex items-center justify-between gap-3 border-b border-line py-1.5 last:border-0"
              >
                <span className="min-w-0">{file.label}</span>
                <span className="flex w-32 shrink-0">
                  <OrderFile revision={revision.id} file={file} />
                </span>
              </li>
            ))}
          </ul>
        </PanelSection>
      )}
    </>
  );
}
