'use client';

import { I18nProvider } from 'react-aria-components/I18nProvider';
import type { Derivation } from '@/geometry';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';
import { EditScreen } from './edit-screen';
import { ReadScreen } from './read-screen';

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
