import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import type { Design as DesignParameters } from '@/geometry';
import { base } from './base';
import { User } from './user';
import { Workshop } from './workshop';

/** Raise it, with an upgrade on reading, when stored parameters take another shape. */
export const PARAMETERS_FORMAT = 1;

/** How many findings of each severity the kernel had at the last save. */
export interface CheckCounts {
  ok: number;
  warn: number;
  fail: number;
}

/** A workshop's design: the parameters only; plates are derived from them when asked for. */
export const Design = defineEntity({
  name: 'Design',
  tableName: 'designs',
  indexes: [{ properties: ['workshop', 'updatedAt'] }],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    name: p.string().length(80),
    /** Goes up by one at every change; a writer must name the one it began from. */
    version: p.integer().default(1),
    parameters: p.json<DesignParameters>(),
    parametersFormat: p.integer().default(PARAMETERS_FORMAT),
    /** Of the kernel that made `checks`. */
    kernel: p.string().length(20),
    checks: p.json<CheckCounts>(),
    createdBy: () => p.manyToOne(User),
    updatedBy: () => p.manyToOne(User),
    updatedAt: p.datetime(3),
    /** Set when deleted; the row stays, for the record's sake. */
    deletedAt: p.datetime(3).nullable(),
  },
});
export type Design = InferEntity<typeof Design>;
