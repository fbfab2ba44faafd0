'use client';

import { useRouter } from 'next/navigation';
import { join } from '@/components/api/account';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { signInHere } from './sign-in-here';
import { TaskNotice } from './task-notice';
import { useTask } from './use-task';

/** `new` has no account, `known` has one and is signed out, `here` is signed in. */
type Comer = 'new' | 'known' | 'here';

const hints: Record<Comer, string> = {
  new: 'Choose a name for the others to see, and a password.',
  known: 'There is an account of yours here: sign in to join with it.',
  here: 'You are signed in as this person.',
};

export function JoinForm({
  secret,
  email,
  workshop,
  comer,
}: {
  secret: string;
  email: string;
  workshop: string;
  comer: Comer;
}) {
  const router = useRouter();
  const task = useTask();
  const onSubmit = task.submit(async ({ name, password = '' }) => {
    if (comer === 'known') await signInHere(email, password);
    await join({ secret, ...(comer === 'new' && { name: name ?? '', password }) });
    if (comer === 'new') await signInHere(email, password);
    router.replace('/designs');
    router.refresh();
    return null;
  });
  return (
    <form method="post" onSubmit={onSubmit} className="flex flex-col gap-4">
      <p>{hints[comer]}</p>
      <TaskNotice {...task} />
      <TextField
        label="Email"
        name="email"
        type="email"
        autoComplete="username"
        value={email}
        isReadOnly
      />
      {comer === 'new' && (
        <TextField label="Your name" name="name" autoComplete="name" isRequired />
      )}
      {comer !== 'here' && (
        <TextField
          label="Password"
          name="password"
          type="password"
          autoComplete={comer === 'new' ? 'new-password' : 'current-password'}
          isRequired
          {...(comer === 'new' && { description: 'At least 12 characters.' })}
        />
      )}
      <Button type="submit" look="action" isDisabled={task.busy}>
        {task.busy ? 'Joining' : `Join ${workshop}`}
      </Button>
    </form>
  );
}
