import type { Metadata } from 'next';
import { SignUpForm } from '@/components/account/sign-up-form';
import { signUpAction } from './actions';

export const metadata: Metadata = { title: 'Set up a workshop' };

export default function SignUpPage() {
  return <SignUpForm signUp={signUpAction} />;
}
