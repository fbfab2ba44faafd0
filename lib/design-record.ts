import 'server-only';
import type { Loaded } from '@mikro-orm/postgresql';
import { PARAMETERS_FORMAT, type Design as StoredDesign } from '@/entities';
import { checkDesign, type Design } from '@/geometry';
import { mayEdit, type Viewer } from './access';
import type { DesignRecord, DesignSummary } from './schemas/api';

type WithPerson = Loaded<StoredDesign, 'updatedBy'>;

/** The stored parameters as today's kernel takes them. @throws when they no longer fit. */
export function readParameters(stored: StoredDesign): Design {
  if (stored.parametersFormat !== PARAMETERS_FORMAT) {
    throw new Error(
      `design ${stored.id}: parameters have format ${stored.parametersFormat}, not ${PARAMETERS_FORMAT}`,
    );
  }
  return checkDesign(stored.parameters);
}

/** What the list has of it. */
function toSummary(stored: WithPerson): DesignSummary {
  const { id, name, status, version, checks, updatedBy } = stored;
  return {
    id,
    name,
    status,
    version,
    laws: stored.parameters.sections.map((section) => section.law),
    checks,
    updatedAt: stored.updatedAt.toISOString(),
    updatedBy: { id: updatedBy.id, name: updatedBy.name },
  };
}

/** All of a design, as this person may see it. */
export function toRecord(stored: WithPerson, viewer: Viewer): DesignRecord {
  return {
    ...toSummary(stored),
    design: readParameters(stored),
    kernel: stored.kernel,
    createdAt: stored.createdAt.toISOString(),
    mayEdit: mayEdit(viewer.role),
  };
}
