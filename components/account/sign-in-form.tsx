'use client';

import { signIn } from 'next-auth/react';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { TextField } from '@/components/ui/text-field';
import { safeCallback } from './callback';

const messages: Record<string, string> = {
  CredentialsSignin:
    'No account has this address with this password. Check both; the password is told apart by capitals.',
  'too-many':
    'Too many attempts with this address. Wait a few minutes, then try again with the right password.',
};

export function SignInForm({ callbackUrl }: { callbackUrl?: string | undefined }) {
  const router = useRouter();
  const [message, setMessage] = useState<string>();
  const [busy, setBusy] = useState(false);

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const data = new FormData(event.currentTarget);
    setBusy(true);
    setMessage(undefined);
    const answer = await signIn('credentials', {
      redirect: false,
      email: data.get('email'),
      password: data.get('password'),
    }).catch(() => undefined);
    if (answer?.ok) {
      router.replace(safeCallback(callbackUrl, window.location.origin));
      router.refresh();
      return;
    }
    setBusy(false);
    setMessage(
      messages[answer?.error ?? ''] ??
        'The server could not be reached. Try again in a moment.',
    );
  }

  return (
    <form method="post" onSubmit={submit} className="flex flex-col gap-4">
      <h1 className="text-head">Sign in</h1>
      {message && <Notice look="bad">{message}</Notice>}
      <TextField label="Email" name="email" type="email" autoComplete="username" isRequired />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        isRequired
      />
      <Button type="submit" look="action" isDisabled={busy}>
        {busy ? 'Signing in' : 'Sign in'}
      </Button>
      <p className="text-ink-2">
        <Link href="/forgot" className="underline">
          Password forgotten?
        </Link>
      </p>
      <p className="text-ink-2">
        No account?{' '}
        <Link href="/sign-up" className="underline">
          Set up a workshop
        </Link>
      </p>
    </form>
  );
}
