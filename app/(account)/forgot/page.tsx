import type { Metadata } from 'next';
import { ForgotForm } from '@/components/account/forgot-form';

export const metadata: Metadata = { title: 'A new password' };

export default function ForgotPage() {
  return <ForgotForm />;
}
