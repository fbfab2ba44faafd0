import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { User } from './user';
import { Workshop } from './workshop';

/** Asks somebody into a workshop, once, until it expires. The link's secret is not kept. */
export const Invitation = defineEntity({
  name: 'Invitation',
  tableName: 'invitations',
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop).index(),
    email: p.string().length(254),
    role: p.enum(['owner', 'builder', 'machinist']),
    /** SHA-256 of the link's secret, base64url. */
    tokenHash: p.string().length(43).unique(),
    invitedBy: () => p.manyToOne(User),
    expiresAt: p.datetime(3),
    usedAt: p.datetime(3).nullable(),
    withdrawnAt: p.datetime(3).nullable(),
  },
});
export type Invitation = InferEntity<typeof Invitation>;
