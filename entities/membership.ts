import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { User } from './user';
import { Workshop } from './workshop';

/** What mail tells of. Invitations and resets always come: nobody else asks for them. */
export const mailChoices = [
  'released',
  'withdrawn',
  'ordered',
  'asked',
  'answered',
  'cut',
] as const;
export type MailChoice = (typeof mailChoices)[number];

/** What a person may do in a workshop. Once removed, their sessions there are over. */
export const Membership = defineEntity({
  name: 'Membership',
  tableName: 'memberships',
  uniques: [{ properties: ['user', 'workshop'] }],
  properties: {
    ...base(),
    user: () => p.manyToOne(User).deleteRule('cascade'),
    workshop: () => p.manyToOne(Workshop).deleteRule('cascade').index(),
    role: p.enum(['owner', 'builder', 'machinist']),
    /** What this person does not want mail about. */
    mutedMail: p.json<MailChoice[]>().onCreate(() => []),
    /** The row stays, so that what they did keeps its name. */
    removedAt: p.datetime(3).nullable(),
  },
});
export type Membership = InferEntity<typeof Membership>;
