import type { EntityManager } from '@mikro-orm/postgresql';
import { DesignVersion, type Design } from '@/entities';

/** Keeps a design as it has just been saved, in the transaction of the save. */
export function keepVersion(tx: EntityManager, design: Design): void {
  const { workshop, version, name, parameters, parametersFormat, kernel, checks } = design;
  tx.create(DesignVersion, {
    workshop,
    design,
    version,
    name,
    parameters,
    parametersFormat,
    kernel,
    checks,
    savedBy: design.updatedBy,
    createdAt: design.updatedAt,
  });
}
