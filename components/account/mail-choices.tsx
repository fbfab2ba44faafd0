'use client';

import { useState } from 'react';
import { chooseMail } from '@/components/api/account';
import type { OwnWorkshop } from '@/lib/schemas/account';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

type Choice = OwnWorkshop['muted'][number];

/** What mail can tell of, and who gets it. */
const choices: readonly { readonly value: Choice; readonly label: string }[] = [
  { value: 'released', label: 'A revision is released' },
  { value: 'withdrawn', label: 'A released revision is withdrawn' },
  { value: 'ordered', label: 'A cut order is placed' },
  { value: 'asked', label: 'A cut order comes back with a question' },
  { value: 'answered', label: 'A question is answered' },
  { value: 'cut', label: 'A cut order is cut' },
];

/** Which mail the person wants from one workshop. Each tick is kept at once. */
export function MailChoices({ workshop }: { workshop: OwnWorkshop }) {
  const [muted, setMuted] = useState(workshop.muted);
  const task = useTask();
  const choose = (value: Choice, wanted: boolean) => {
    const before = muted;
    const next = wanted ? muted.filter((one) => one !== value) : [...muted, value];
    setMuted(next);
    task.run(async () => {
      try {
        await chooseMail(workshop.id, next);
        return 'Kept.';
      } catch (error) {
        setMuted(before);
        throw error;
      }
    });
  };
  return (
    <fieldset className="flex flex-col gap-1">
      <legend className="pb-1 text-ink-2">Mail from {workshop.name} when</legend>
      <div className="grid gap-x-6 wide:grid-cols-2">
        {choices.map(({ value, label }) => (
          <label key={value} className="flex min-h-9 items-center gap-2 max-bench:min-h-11">
            <input
              type="checkbox"
              checked={!muted.includes(value)}
              disabled={task.busy}
              onChange={(event) => choose(value, event.target.checked)}
              className="size-4.5 accent-action"
            />
            {label}
          </label>
        ))}
      </div>
      <TaskNotice {...task} />
    </fieldset>
  );
}
