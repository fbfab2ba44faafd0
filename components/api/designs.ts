import {
  designFilesSchema,
  designListSchema,
  designRecordSchema,
  type CreateDesign,
  type DesignRecord,
  type SaveDesign,
} from '@/lib/schemas/api';
import { request, send } from './request';

export const fetchDesigns = async () =>
  (await request(designListSchema, '/api/designs')).designs;

export const fetchDesign = (id: string): Promise<DesignRecord> =>
  request(designRecordSchema, `/api/designs/${id}`);

export const createDesign = (body: CreateDesign): Promise<DesignRecord> =>
  request(designRecordSchema, '/api/designs', { method: 'POST', body });

export const saveDesign = (id: string, body: SaveDesign): Promise<DesignRecord> =>
  request(designRecordSchema, `/api/designs/${id}`, { method: 'PUT', body });

export async function deleteDesign(id: string): Promise<void> {
  await send(`/api/designs/${id}`, { method: 'DELETE' });
}

export const fetchFiles = (id: string) =>
  request(designFilesSchema, `/api/designs/${id}/files`);
