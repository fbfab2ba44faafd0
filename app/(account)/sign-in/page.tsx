import type { Metadata } from 'next';
import { SignInForm } from '@/components/account/sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const { callbackUrl } = await searchParams;
  return <SignInForm callbackUrl={typeof callbackUrl === 'string' ? callbackUrl : undefined} />;
}
