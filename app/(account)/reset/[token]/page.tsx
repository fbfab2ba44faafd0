import type { Metadata } from 'next';
import Link from 'next/link';
import { ResetForm } from '@/components/account/reset-form';
import { buttonClass } from '@/components/ui/button-class';
import { Notice } from '@/components/ui/notice';
import { openReset } from '@/lib/account/reset-password';
import { RequestError } from '@/lib/errors';

export const metadata: Metadata = { title: 'A new password', robots: { index: false } };

export default async function ResetPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const reset = await openReset(token).catch((error: unknown) => {
    if (error instanceof RequestError && error.code === 'not-found') return error;
    throw error;
  });
  if (reset instanceof RequestError) {
    return (
      <>
        <h1 className="text-head">This link does not open</h1>
        <Notice look="warn">{reset.message}</Notice>
        <Link href="/forgot" className={buttonClass('plain')}>
          Ask for another
        </Link>
      </>
    );
  }
  return (
    <>
      <h1 className="text-head">A new password</h1>
      <ResetForm secret={token} email={reset.email} />
    </>
  );
}
