'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { TextField } from '@/components/ui/text-field';
import { loadReader } from '@/components/units/load-reader';
import { formatQuantity } from '@/geometry';
import type { Order } from '@/lib/schemas/order';
import { useOrderChange } from './use-order-change';

/** mm; null for nothing typed, not-a-number for what cannot be read. */
async function readKerf(text: string): Promise<number | null> {
  if (text.trim() === '') return null;
  return (await loadReader())(text, 'length', 'mm') ?? Number.NaN;
}

const wholeOf = (text: string): number => (text.trim() === '' ? Number.NaN : Number(text));

/** What came of the cutting; the sheets leave the store with it. */
export default function FinishDialog({
  order,
  onClose,
}: {
  order: Order;
  onClose: () => void;
}) {
  const { sheet, machine } = order;
  const [sheets, setSheets] = useState(String(order.sheets));
  const [scrap, setScrap] = useState('0');
  const [kerf, setKerf] = useState('');
  const [unread, setUnread] = useState(false);
  const finishing = useOrderChange(order.id, onClose);

  async function finish() {
    const actualKerf = await readKerf(kerf);
    setUnread(Number.isNaN(actualKerf));
    if (Number.isNaN(actualKerf)) return;
    finishing.mutate((calls) =>
      calls.finishOrder(order.id, {
        version: order.version,
        sheets: wholeOf(sheets),
        scrap: wholeOf(scrap),
        actualKerf,
      }),
    );
  }

  return (
    <Dialog title={`Order ${order.number} is cut`} isOpen onClose={onClose}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          void finish();
        }}
        className="flex flex-col gap-4"
      >
        <TextField
          label="Sheets used"
          inputMode="numeric"
          autoComplete="off"
          value={sheets}
          onChange={setSheets}
          description={`They leave the store: ${sheet.values.count} of ${sheet.name} lie there.`}
          autoFocus
        />
        <TextField
          label="Pieces spoilt"
          inputMode="numeric"
          autoComplete="off"
          value={scrap}
          onChange={setScrap}
        />
        <TextField
          label="Kerf as measured, if it was"
          autoComplete="off"
          value={kerf}
          onChange={setKerf}
          description={`${machine.name} is set to ${formatQuantity(Number(machine.values.kerf), 'length')}.`}
          errorMessage={unread ? 'Not a length; give it as 0.18 mm, or nothing' : undefined}
        />
        {finishing.isError && <Notice look="bad">{finishing.error.message}</Notice>}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>Not yet</Button>
          <Button type="submit" look="action" isDisabled={finishing.isPending}>
            {finishing.isPending ? 'Saving' : 'It is cut'}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
