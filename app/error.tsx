'use client';

import { Button } from '@/components/ui/button';
import { PageMessage } from '@/components/ui/page-message';

export default function ErrorPage({ reset }: { error: Error; reset: () => void }) {
  return (
    <PageMessage title="This page could not be shown">
      <p>
        Something went wrong on our side and has been logged. Unsaved work on a design is kept
        in this browser and will be offered again.
      </p>
      <Button look="action" onPress={reset}>
        Try again
      </Button>
    </PageMessage>
  );
}
