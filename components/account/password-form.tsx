'use client';

import { changePassword } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { signInHere } from './sign-in-here';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

export function PasswordForm({ email }: { email: string }) {
  const task = useTask();
  const onSubmit = task.submit(async ({ current = '', password = '' }, form) => {
    await changePassword({ current, password });
    await signInHere(email, password);
    form.reset();
    return 'The new password holds. Other browsers are signed out.';
  });
  return (
    <form method="post" onSubmit={onSubmit} className="flex flex-col items-start gap-3">
      <div className="flex w-full max-w-80 flex-col gap-3">
        <TextField
          label="Password now"
          name="current"
          type="password"
          autoComplete="current-password"
          isRequired
        />
        <TextField
          label="New password"
          name="password"
          type="password"
          autoComplete="new-password"
          description="At least 12 characters."
          isRequired
        />
      </div>
      <TaskNotice {...task} />
      <Button type="submit" isDisabled={task.busy}>
        Change the password
      </Button>
    </form>
  );
}
