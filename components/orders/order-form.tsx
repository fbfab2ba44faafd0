'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { inputClass } from '@/components/ui/input-class';
import { Notice } from '@/components/ui/notice';
import { SelectField } from '@/components/ui/select-field';
import { TextArea } from '@/components/ui/text-area';
import { TextField } from '@/components/ui/text-field';
import type { Order, Orderable } from '@/lib/schemas/order';
import type { ShopItem } from '@/lib/schemas/shop-item';
import { fittingSheets, missingKinds, wantedOf } from './sheet-choice';

const LONGEST_NOTE = 500;
const listed = new Intl.ListFormat('en-GB');

/** What is asked for, as the server takes it. */
export interface Terms {
  readonly sheet: string;
  readonly machine: string;
  readonly quantity: number;
  readonly sheets: number;
  readonly dueOn: string;
  readonly note: string;
}

type Texts = Record<keyof Terms, string>;

const textsOf = (order: Order | null): Texts => ({
  sheet: order?.sheet.id ?? '',
  machine: order?.machine.id ?? '',
  quantity: String(order?.quantity ?? 1),
  sheets: String(order?.sheets ?? 1),
  dueOn: order?.dueOn ?? '',
  note: order?.note ?? '',
});

const wholeOf = (text: string): number => (text.trim() === '' ? Number.NaN : Number(text));
const optionOf = ({ id, name }: ShopItem) => ({ value: id, label: name });

/** Quantity, sheet, machine, day and note of an order for one revision. */
export function OrderForm({
  revision,
  begin,
  sheets,
  machines,
  pending,
  refusal,
  send,
  onSend,
  onClose,
}: {
  revision: Orderable;
  /** The one that is changed, or that a new one is like. */
  begin: Order | null;
  sheets: readonly ShopItem[];
  machines: readonly ShopItem[];
  pending: boolean;
  refusal: string | null;
  /** What the button says. */
  send: string;
  onSend: (terms: Terms) => void;
  onClose: () => void;
}) {
  const [texts, setTexts] = useState(() => textsOf(begin));
  const set = (key: keyof Terms) => (text: string) =>
    setTexts((now) => ({ ...now, [key]: text }));
  const { wants } = revision;
  const fitting = fittingSheets(wants, sheets);
  const sheet = fitting.find(({ id }) => id === texts.sheet) ?? fitting[0];
  const machine = machines.find(({ id }) => id === texts.machine) ?? machines[0];
  const covered = wantedOf(wants, sheet);
  const others = wants.filter((wanted) => wanted !== covered);
  const missing = missingKinds(wants, sheets);

  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        onSend({
          ...texts,
          sheet: sheet?.id ?? '',
          machine: machine?.id ?? '',
          quantity: wholeOf(texts.quantity),
          sheets: wholeOf(texts.sheets),
        });
      }}
      className="flex flex-col gap-4"
    >
      {missing.length > 0 && (
        <Notice look="warn">
          The store holds no {listed.format(missing.map((kind) => kind.sheet))}; add it under
          Machines and sheet to order what is cut from it.
        </Notice>
      )}
      {sheet && (
        <SelectField
          label="Sheet"
          value={sheet.id}
          options={fitting.map((item) => ({
            value: item.id,
            label: `${item.name} (${item.values.count} in store)`,
          }))}
          onChange={set('sheet')}
        />
      )}
      {covered && (
        <p>
          From it: {listed.format(covered.parts)}.
          {others.length > 0 &&
            ` Order ${listed.format(others.flatMap(({ parts }) => parts))} apart, from other sheet.`}
        </p>
      )}
      <div className="grid gap-4 wide:grid-cols-2">
        <TextField
          label="Quantity, capacitors"
          inputMode="numeric"
          autoComplete="off"
          value={texts.quantity}
          onChange={set('quantity')}
        />
        <TextField
          label="Sheets to use"
          inputMode="numeric"
          autoComplete="off"
          value={texts.sheets}
          onChange={set('sheets')}
        />
        {machine ? (
          <SelectField
            label="Machine"
            value={machine.id}
            options={machines.map(optionOf)}
            onChange={set('machine')}
          />
        ) : (
          <Notice look="warn">No machine yet; add one under Machines and sheet.</Notice>
        )}
        <label className="flex flex-col gap-1">
          <span className="font-medium">Due date</span>
          <input
            type="date"
            value={texts.dueOn}
            onChange={(event) => set('dueOn')(event.target.value)}
            className={inputClass}
          />
        </label>
      </div>
      <TextArea
        label="Note"
        rows={2}
        value={texts.note}
        onChange={set('note')}
        maxLength={LONGEST_NOTE}
      />
      {refusal !== null && <Notice look="bad">{refusal}</Notice>}
      <div className="flex flex-wrap justify-end gap-2">
        <Button onPress={onClose}>Close</Button>
        <Button type="submit" look="action" isDisabled={pending || !sheet || !machine}>
          {pending ? 'Sending' : send}
        </Button>
      </div>
    </form>
  );
}
