'use client';

import { useRouter } from 'next/navigation';
import { resetPassword } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { signInHere } from './sign-in-here';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

export function ResetForm({ secret, email }: { secret: string; email: string }) {
  const router = useRouter();
  const task = useTask();
  const onSubmit = task.submit(async ({ password = '' }) => {
    await resetPassword({ secret, password });
    await signInHere(email, password);
    router.replace('/designs');
    router.refresh();
    return null;
  });
  return (
    <form method="post" onSubmit={onSubmit} className="flex flex-col gap-4">
      <p>Every browser that is signed in with the old one is signed out.</p>
      <TaskNotice {...task} />
      <TextField
        label="Email"
        name="email"
        type="email"
        autoComplete="username"
        value={email}
        isReadOnly
      />
      <TextField
        label="New password"
        name="password"
        type="password"
        autoComplete="new-password"
        description="At least 12 characters."
        isRequired
      />
      <Button type="submit" look="action" isDisabled={task.busy}>
        {task.busy ? 'Saving' : 'Set the new password'}
      </Button>
    </form>
  );
}
