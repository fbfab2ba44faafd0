import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';

/** Owns designs; everything a person sees belongs to the workshop they are a member of. */
export const Workshop = defineEntity({
  name: 'Workshop',
  tableName: 'workshops',
  properties: {
    ...base(),
    name: p.string().length(80),
  },
});
export type Workshop = InferEntity<typeof Workshop>;
