import 'server-only';
import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { PARAMETERS_FORMAT, type Design as StoredDesign } from '@/entities';
import { checkDesign, type Design } from '@/geometry';
import { mayEdit, type Viewer } from './access';
import { designState, revisionsOf } from './revisions/design-state';
import type { DesignRecord } from './schemas/api';

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

/** All of a design, as this person may see it. */
export async function toRecord(
  tx: EntityManager,
  stored: WithPerson,
  viewer: Viewer,
): Promise<DesignRecord> {
  const { id, name, version, checks, updatedBy } = stored;
  return {
    id,
    name,
    state: designState(version, (await revisionsOf(tx, [id])).get(id) ?? []),
    version,
    laws: stored.parameters.sections.map((section) => section.law),
    checks,
    updatedAt: stored.updatedAt.toISOString(),
    updatedBy: { id: updatedBy.id, name: updatedBy.name },
    design: readParameters(stored),
    kernel: stored.kernel,
    createdAt: stored.createdAt.toISOString(),
    mayEdit: mayEdit(viewer.role),
  };
}
