import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { User } from './user';
import { Workshop } from './workshop';

/** What a person may do in a workshop. Taking the row away ends their sessions there. */
export const Membership = defineEntity({
  name: 'Membership',
  tableName: 'memberships',
  uniques: [{ properties: ['user', 'workshop'] }],
  properties: {
    ...base(),
    user: () => p.manyToOne(User).deleteRule('cascade'),
    workshop: () => p.manyToOne(Workshop).deleteRule('cascade').index(),
    role: p.enum(['owner', 'builder', 'machinist']),
  },
});
export type Membership = InferEntity<typeof Membership>;
