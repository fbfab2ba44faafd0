import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';

/** A person who can sign in. */
export const User = defineEntity({
  name: 'User',
  tableName: 'users',
  checks: [{ name: 'users_email_check', expression: 'email = lower(email)' }],
  properties: {
    ...base(),
    /** Lower case; the database refuses anything else, so one address is one person. */
    email: p.string().length(254).unique(),
    name: p.string().length(80),
    /** argon2id, with its salt and parameters. */
    passwordHash: p.string().length(255).hidden(),
    /** A session holds while it names this one; raising it ends all of them. */
    sessionEpoch: p.integer().onCreate(() => 0),
  },
});
export type User = InferEntity<typeof User>;
