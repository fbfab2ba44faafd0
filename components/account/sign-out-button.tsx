'use client';

import { Button } from '@/components/ui/button';
import type { ButtonLook } from '@/components/ui/button-class';

export function SignOutButton({ look = 'quiet' }: { look?: ButtonLook }) {
  return (
    <Button
      look={look}
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
