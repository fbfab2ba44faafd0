'use client';

import dynamic from 'next/dynamic';
import { I18nProvider } from 'react-aria-components/I18nProvider';
import type { Derivation } from '@/geometry';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';

// Each person loads the one that they see: no form for those who only read.
const EditScreen = dynamic(() => import('./edit-screen').then(({ EditScreen }) => EditScreen));
const ReadScreen = dynamic(() => import('./read-screen').then(({ ReadScreen }) => ReadScreen));

/** One open design; whoever may not change it gets a screen without a form. */
export function DesignScreen({
  record,
  derivation,
  files,
  userId,
}: {
  record: DesignRecord;
  derivation: Derivation;
  files: DesignFiles | null;
  userId: string;
}) {
  return (
    <I18nProvider locale="en-GB">
      {record.mayEdit ? (
        <EditScreen record={record} derivation={derivation} files={files} userId={userId} />
      ) : (
        <ReadScreen record={record} derivation={derivation} files={files} />
      )}
    </I18nProvider>
  );
}
