import { z } from 'zod';
import { ownWorkshopSchema, type OwnWorkshop } from '@/lib/schemas/account';
import { request, send } from './request';

const emailSchema = z.object({ email: z.string() });

/** Joins by an invitation's secret; a new person also sends name and password. */
export const join = (body: {
  secret: string;
  name?: string;
  password?: string;
}): Promise<{ email: string }> => request(emailSchema, '/api/join', { method: 'POST', body });

export async function askReset(email: string): Promise<void> {
  await send('/api/forgot', { method: 'POST', body: { email } });
}

export const resetPassword = (body: {
  secret: string;
  password: string;
}): Promise<{ email: string }> => request(emailSchema, '/api/reset', { method: 'POST', body });

export async function saveName(name: string): Promise<void> {
  await send('/api/account/name', { method: 'PUT', body: { name } });
}

export const changePassword = (body: {
  current: string;
  password: string;
}): Promise<{ email: string }> =>
  request(emailSchema, '/api/account/password', { method: 'PUT', body });

export async function endSessions(): Promise<void> {
  await send('/api/account/sessions', { method: 'DELETE' });
}

export async function openWorkshop(workshop: string): Promise<void> {
  await send('/api/account/workshops', { method: 'POST', body: { workshop } });
}

export const chooseMail = (id: string, muted: OwnWorkshop['muted']): Promise<OwnWorkshop> =>
  request(ownWorkshopSchema, `/api/account/workshops/${id}/mail`, {
    method: 'PUT',
    body: { muted },
  });
