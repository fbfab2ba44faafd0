import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import type { Derivation, Design as DesignParameters } from '@/geometry';
import { base } from './base';
import { Design, type CheckCounts } from './design';
import { User } from './user';
import { Workshop } from './workshop';

/** An owner's word that a failing check does not stop the release; printed on the drawing. */
export interface Waiver {
  /** The finding's code and section. */
  readonly code: string;
  readonly section: number | null;
  readonly label: string;
  readonly reason: string;
  readonly by: string;
}

/**
 * A named, frozen copy of a design. The database refuses to change what is frozen: everything
 * but its state, who moved it there, and the waivers before release.
 */
export const Revision = defineEntity({
  name: 'Revision',
  tableName: 'revisions',
  uniques: [{ properties: ['design', 'number'] }],
  indexes: [
    { properties: ['workshop', 'state'] },
    {
      name: 'revisions_one_released',
      // At most one revision of a design is the one to cut.
      expression: `create unique index "revisions_one_released" on "revisions" ("design_id") where state = 'released'`,
    },
  ],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    design: () => p.manyToOne(Design),
    /** 1, 2, 3 within the design. */
    number: p.integer(),
    name: p.string().length(80),
    note: p.string().length(500),
    /** The design's name and version that it froze. */
    designName: p.string().length(80),
    version: p.integer(),
    parameters: p.json<DesignParameters>(),
    parametersFormat: p.integer(),
    kernel: p.string().length(20),
    checks: p.json<CheckCounts>(),
    /** All that the kernel of then said: outlines, curves, figures, findings. */
    derivation: p.json<Derivation>(),
    state: p.enum(['draft', 'in-review', 'released', 'superseded', 'withdrawn']),
    waivers: p.json<Waiver[]>().onCreate(() => []),
    createdBy: () => p.manyToOne(User),
    reviewAskedBy: () => p.manyToOne(User).nullable(),
    releasedBy: () => p.manyToOne(User).nullable(),
    releasedAt: p.datetime(3).nullable(),
    withdrawnBy: () => p.manyToOne(User).nullable(),
    withdrawnAt: p.datetime(3).nullable(),
    withdrawnReason: p.string().length(500).nullable(),
    updatedAt: p.datetime(3),
  },
});
export type Revision = InferEntity<typeof Revision>;
