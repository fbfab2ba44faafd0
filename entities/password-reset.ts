import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { User } from './user';

/** Lets somebody choose a new password, once, until it expires. The link's secret is not kept. */
export const PasswordReset = defineEntity({
  name: 'PasswordReset',
  tableName: 'password_resets',
  properties: {
    ...base(),
    user: () => p.manyToOne(User).deleteRule('cascade').index(),
    /** SHA-256 of the link's secret, base64url. */
    tokenHash: p.string().length(43).unique(),
    expiresAt: p.datetime(3),
    usedAt: p.datetime(3).nullable(),
  },
});
export type PasswordReset = InferEntity<typeof PasswordReset>;
