import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import type { Design as DesignParameters } from '@/geometry';
import { base } from './base';
import { Design, type CheckCounts } from './design';
import { User } from './user';
import { Workshop } from './workshop';

/** A design as it was saved: one row for each save, never changed. */
export const DesignVersion = defineEntity({
  name: 'DesignVersion',
  tableName: 'design_versions',
  uniques: [{ properties: ['design', 'version'] }],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    design: () => p.manyToOne(Design),
    version: p.integer(),
    name: p.string().length(80),
    parameters: p.json<DesignParameters>(),
    parametersFormat: p.integer(),
    kernel: p.string().length(20),
    checks: p.json<CheckCounts>(),
    savedBy: () => p.manyToOne(User),
  },
});
export type DesignVersion = InferEntity<typeof DesignVersion>;
