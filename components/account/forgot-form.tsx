'use client';

import Link from 'next/link';
import { askReset } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

export function ForgotForm() {
  const task = useTask();
  const onSubmit = task.submit(async ({ email = '' }) => {
    await askReset(email);
    return `If ${email} has an account here, a mail with a link is on its way. The link opens once, within an hour.`;
  });
  return (
    <form method="post" onSubmit={onSubmit} className="flex flex-col gap-4">
      <h1 className="text-head">A new password</h1>
      <p>Give the email of your account; a link to choose a new password comes by mail.</p>
      <TaskNotice {...task} />
      <TextField label="Email" name="email" type="email" autoComplete="username" isRequired />
      <Button type="submit" look="action" isDisabled={task.busy}>
        {task.busy ? 'Asking' : 'Send the link'}
      </Button>
      <p className="text-ink-2">
        <Link href="/sign-in" className="underline">
          Back to sign in
        </Link>
      </p>
    </form>
  );
}
