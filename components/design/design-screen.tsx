'use client';

import dynamic from 'next/dynamic';
import { I18nProvider } from 'react-aria-components/I18nProvider';
import { mayNothing } from '@/components/revisions/may';
import type { Derivation } from '@/geometry';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';
import type { Revision } from '@/lib/schemas/revision';

// Each person loads the one that they see: no form for those who only read.
const EditScreen = dynamic(() => import('./edit-screen').then(({ EditScreen }) => EditScreen));
const RevisionScreen = dynamic(() =>
  import('@/components/revisions/revision-screen').then(({ RevisionScreen }) => RevisionScreen),
);

/** One open design; whoever may not change it sees the revision that is cut from. */
export function DesignScreen({
  record,
  derivation,
  files,
  revision,
  userId,
}: {
  record: DesignRecord;
  derivation: Derivation;
  files: DesignFiles | null;
  /** The revision that it is, for those who see no draft. */
  revision: Revision | null;
  userId: string;
}) {
  return revision ? (
    <RevisionScreen
      revision={revision}
      design={record.design}
      derivation={derivation}
      files={files}
      may={mayNothing}
    />
  ) : (
    <I18nProvider locale="en-GB">
      <EditScreen record={record} derivation={derivation} files={files} userId={userId} />
    </I18nProvider>
  );
}
