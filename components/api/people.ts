import type { Role } from '@/lib/schemas/api';
import { sentMailsSchema, type SentMails } from '@/lib/schemas/mail';
import { peopleSchema, type People } from '@/lib/schemas/people';
import { request, send } from './request';

export const peopleKey = ['people'] as const;
export const mailsKey = ['mails'] as const;

export const fetchPeople = (): Promise<People> => request(peopleSchema, '/api/people');

export const fetchMails = (): Promise<SentMails> => request(sentMailsSchema, '/api/mails');

export async function invitePerson(body: { email: string; role: Role }): Promise<void> {
  await send('/api/invitations', { method: 'POST', body });
}

export async function withdrawInvitation(id: string): Promise<void> {
  await send(`/api/invitations/${id}`, { method: 'DELETE' });
}

export async function setRole(id: string, role: Role): Promise<void> {
  await send(`/api/people/${id}`, { method: 'PUT', body: { role } });
}

export async function removeMember(id: string): Promise<void> {
  await send(`/api/people/${id}`, { method: 'DELETE' });
}
