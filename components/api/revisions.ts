import { designRecordSchema, type DesignRecord } from '@/lib/schemas/api';
import {
  historySchema,
  revisionFilesSchema,
  revisionSchema,
  type History,
  type MoveRevision,
  type NameRevision,
  type Restore,
  type Revision,
} from '@/lib/schemas/revision';
import { request } from './request';

export const fetchHistory = (designId: string): Promise<History> =>
  request(historySchema, `/api/designs/${designId}/history`);

export const fetchRevision = (id: string): Promise<Revision> =>
  request(revisionSchema, `/api/revisions/${id}`);

export const fetchRevisionFiles = (id: string) =>
  request(revisionFilesSchema, `/api/revisions/${id}/files`);

export const nameRevision = (designId: string, body: NameRevision): Promise<Revision> =>
  request(revisionSchema, `/api/designs/${designId}/revisions`, { method: 'POST', body });

export const moveRevision = (id: string, body: MoveRevision): Promise<Revision> =>
  request(revisionSchema, `/api/revisions/${id}/state`, { method: 'PUT', body });

/** Makes an earlier state of a design its newest version. */
export const restoreDesign = (designId: string, body: Restore): Promise<DesignRecord> =>
  request(designRecordSchema, `/api/designs/${designId}/restore`, { method: 'POST', body });
