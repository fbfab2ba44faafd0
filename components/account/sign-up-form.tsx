'use client';

import { signIn } from 'next-auth/react';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useActionState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { TextField } from '@/components/ui/text-field';

export interface SignUpState {
  error?: string;
  field?: string;
  values?: Record<string, string>;
  ok?: boolean;
}

const fields = [
  {
    name: 'workshop',
    label: 'Workshop',
    autoComplete: 'organization',
    description: 'You will be its owner.',
  },
  { name: 'name', label: 'Your name', autoComplete: 'name' },
  { name: 'email', label: 'Email', type: 'email', autoComplete: 'username' },
  {
    name: 'password',
    label: 'Password',
    type: 'password',
    autoComplete: 'new-password',
    description: 'At least 12 characters.',
  },
] as const;

export function SignUpForm({
  signUp,
}: {
  signUp: (previous: SignUpState, data: FormData) => Promise<SignUpState>;
}) {
  const router = useRouter();
  const [state, action, busy] = useActionState(
    async (previous: SignUpState, data: FormData): Promise<SignUpState> => {
      const answer = await signUp(previous, data);
      if (!answer.ok) return answer;
      const signedIn = await signIn('credentials', {
        redirect: false,
        email: data.get('email'),
        password: data.get('password'),
      }).catch(() => undefined);
      router.replace(signedIn?.ok ? '/designs' : '/sign-in');
      router.refresh();
      return answer;
    },
    {},
  );
  const known = fields.some((field) => field.name === state.field);

  return (
    <form action={action} className="flex flex-col gap-4">
      <h1 className="text-head">Set up a workshop</h1>
      {state.error && !known && <Notice look="bad">{state.error}</Notice>}
      {fields.map((field) => (
        <TextField
          key={field.name}
          {...field}
          isRequired
          defaultValue={state.values?.[field.name] ?? ''}
          errorMessage={state.field === field.name ? state.error : undefined}
        />
      ))}
      <Button type="submit" look="action" isDisabled={busy || state.ok === true}>
        {busy ? 'Setting up' : 'Set up the workshop'}
      </Button>
      <p className="text-ink-2">
        Already have an account?{' '}
        <Link href="/sign-in" className="underline">
          Sign in
        </Link>
      </p>
    </form>
  );
}
