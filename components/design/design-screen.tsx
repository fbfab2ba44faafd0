'use client';

import type { Derivation } from '@/geometry';
import type { DesignRecord } from '@/lib/schemas/api';
import { EditScreen } from './edit-screen';
import { ReadScreen } from './read-screen';

/** One open design; whoever may not change it gets a screen without a form. */
export function DesignScreen({
  record,
  derivation,
  userId,
}: {
  record: DesignRecord;
  derivation: Derivation;
  userId: string;
}) {
  return record.mayEdit ? (
    <EditScreen record={record} derivation={derivation} userId={userId} />
  ) : (
    <ReadScreen record={record} derivation={derivation} />
  );
}
