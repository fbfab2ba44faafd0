'use server';

import { headers } from 'next/headers';
import { addressOf } from '@/lib/attempts';
import { toRequestError } from '@/lib/errors';
import { signUp } from '@/lib/sign-up';

export interface SignUpState {
  ok?: boolean;
  error?: string;
  /** Name of the field that the error is about. */
  field?: string;
  /** What was typed, to be shown again; never the password. */
  values?: Record<string, string>;
}

/** Opens a workshop with its owner. Anybody may; the browser signs in with what it was given. */
export async function signUpAction(
  _previous: SignUpState,
  formData: FormData,
): Promise<SignUpState> {
  const text = (field: string) => {
    const value = formData.get(field);
    return typeof value === 'string' ? value : '';
  };
  const values = { workshop: text('workshop'), name: text('name'), email: text('email') };
  try {
    const address = addressOf((await headers()).get('x-forwarded-for'));
    await signUp({ ...values, password: text('password') }, address);
    return { ok: true };
  } catch (error) {
    const { message, field } = toRequestError(error);
    return { error: message, values, ...(field && { field }) };
  }
}
