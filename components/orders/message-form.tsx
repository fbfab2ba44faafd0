'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { TextArea } from '@/components/ui/text-area';
import { ATTACHMENT_LIMITS, type Order, type OrderMessage } from '@/lib/schemas/order';
import { FileChoice } from './file-choice';
import { useOrderChange } from './use-order-change';

const LONGEST = 2000;

type Kind = OrderMessage['kind'];

const words: Readonly<Record<Kind, { label: string; send: string }>> = {
  remark: { label: 'Remark', send: 'Add the remark' },
  question: { label: 'Question', send: 'Return with the question' },
  answer: { label: 'Answer', send: 'Answer, back into the queue' },
};

/** Writes under an order, with photos and files. */
export default function MessageForm({
  order,
  kinds,
  onDone,
  onCancel,
}: {
  order: Order;
  /** What it may be sent as; the first is what it is meant for. */
  kinds: readonly [Kind, ...Kind[]];
  onDone?: () => void;
  onCancel?: () => void;
}) {
  const [text, setText] = useState('');
  const [files, setFiles] = useState<File[]>([]);
  const sending = useOrderChange(order.id, () => {
    setText('');
    setFiles([]);
    onDone?.();
  });
  const send = (kind: Kind) =>
    sending.mutate((calls) => calls.writeMessage(order, kind, text, files));

  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        send(kinds[0]);
      }}
      className="flex flex-col gap-3"
    >
      <TextArea
        label={words[kinds[0]].label}
        value={text}
        onChange={setText}
        maxLength={LONGEST}
        autoFocus={onCancel !== undefined}
      />
      <FileChoice files={files} limits={ATTACHMENT_LIMITS} onChange={setFiles} />
      {sending.isError && <Notice look="bad">{sending.error.message}</Notice>}
      <div className="flex flex-wrap justify-end gap-2">
        {onCancel && <Button onPress={onCancel}>Keep it as it is</Button>}
        {kinds.slice(1).map((kind) => (
          <Button key={kind} isDisabled={sending.isPending} onPress={() => send(kind)}>
            {words[kind].send}
          </Button>
        ))}
        <Button type="submit" look="action" isDisabled={sending.isPending}>
          {sending.isPending ? 'Sending' : words[kinds[0]].send}
        </Button>
      </div>
    </form>
  );
}
