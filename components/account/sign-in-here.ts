import { signIn } from 'next-auth/react';

/** Signs this browser in. @throws Error in words for the person */
export async function signInHere(email: string, password: string): Promise<void> {
  const answer = await signIn('credentials', { redirect: false, email, password }).catch(
    () => undefined,
  );
  if (answer?.ok) return;
  throw new Error(
    answer?.error === 'CredentialsSignin'
      ? `No account of ${email} has this password. Type it again.`
      : answer?.error === 'too-many'
        ? 'Too many attempts with this address. Wait a few minutes, then try again.'
        : 'The server could not be reached. Try again in a moment.',
  );
}
