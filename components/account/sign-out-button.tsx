'use client';

import { Button } from '@/components/ui/button';

export function SignOutButton() {
  return (
    <Button
      look="quiet"
      onPress={async () => {
        // Kept out of the pages' first script: it is needed once a day.
        const { signOut } = await import('next-auth/react');
        await signOut({ callbackUrl: '/sign-in' });
      }}
    >
      Sign out
    </Button>
  );
}
