import type { Design } from '@/geometry';
import type { DesignRecord } from '../schemas/api';
import type { Revision } from '../schemas/revision';

/** A revision as a screen shows a design, for those who see only what is released. */
export function releasedRecord(revision: Revision, design: Design): DesignRecord {
  const { designId, designName, number, state, version, checks, kernel, createdAt } = revision;
  const at = revision.withdrawnAt ?? revision.releasedAt ?? createdAt;
  return {
    id: designId,
    name: designName,
    state: { kind: state === 'released' ? 'released' : 'withdrawn', revision: number },
    version,
    laws: design.sections.map(({ law }) => law),
    checks,
    updatedAt: at,
    updatedBy: revision.withdrawnBy ?? revision.releasedBy ?? revision.createdBy,
    design,
    kernel,
    createdAt,
    mayEdit: false,
  };
}
