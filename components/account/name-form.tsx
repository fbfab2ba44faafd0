'use client';

import { useRouter } from 'next/navigation';
import { saveName } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

export function NameForm({ name, email }: { name: string; email: string }) {
  const router = useRouter();
  const task = useTask();
  const onSubmit = task.submit(async ({ name: given = '' }) => {
    await saveName(given);
    router.refresh();
    return 'Saved.';
  });
  return (
    <form method="post" onSubmit={onSubmit} className="flex flex-col items-start gap-3">
      <p className="text-ink-2">You sign in as {email}.</p>
      <div className="w-full max-w-80">
        <TextField label="Your name" name="name" autoComplete="name" defaultValue={name} />
      </div>
      <TaskNotice {...task} />
      <Button type="submit" isDisabled={task.busy}>
        Save the name
      </Button>
    </form>
  );
}
