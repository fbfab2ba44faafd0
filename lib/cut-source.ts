import 'server-only';
import type { Derived } from '@/geometry';
import { mayEdit, type Viewer } from './access';
import { inWorkshop } from './db';
import { derivePlates } from './kernel/kernel';
import { findDesign } from './queries';
import { NOT_RELEASED, waiverWords } from './revisions/freeze';
import { refuseOutOfUse } from './revisions/out-of-use';
import { derivationOf, findReleased } from './revisions/queries';
import type { Current } from './schemas/api';

/** Plates to make something of, and what they are called. */
export interface CutSource {
  readonly name: string;
  /** As file names and drawings have it: `v5` of what is saved, `3` of a revision. */
  readonly revision: string;
  /** Version of the design. */
  readonly version: number;
  /** Id of the revision, where it is one. */
  readonly revisionId: string | undefined;
  readonly issued: Date;
  /** May it be cut? In words. */
  readonly status: string;
  /** What it was released in spite of, and why. */
  readonly waivers: readonly string[];
  /** Who saved or released it last. */
  readonly by: string;
  readonly derived: Derived;
  readonly current: Current;
}

/**
 * What a person makes dials and sheets of: those who may edit of what is saved, others of the
 * released revision as it was frozen. Null where there is none.
 * @throws RequestError checks-fail when it has no plates, withdrawn when it must not be cut
 */
export async function findCutSource(viewer: Viewer, id: string): Promise<CutSource | null> {
  if (mayEdit(viewer.role)) {
    const saved = await findDesign(viewer, id);
    if (!saved) return null;
    return {
      name: saved.name,
      revision: `v${saved.version}`,
      version: saved.version,
      revisionId: undefined,
      issued: new Date(saved.updatedAt),
      status: NOT_RELEASED,
      waivers: [],
      by: saved.updatedBy.name,
      derived: await derivePlates(saved.design),
      current: saved,
    };
  }
  const revision = await findReleased(viewer, id);
  const frozen = revision && (await derivationOf(viewer, revision.id));
  if (!frozen?.derivation.ok) return null;
  await inWorkshop(viewer, (tx) => refuseOutOfUse(tx, viewer, revision!));
  return {
    name: revision!.designName,
    revision: String(revision!.number),
    version: revision!.version,
    revisionId: revision!.id,
    issued: new Date(revision!.releasedAt!),
    status: 'Released',
    waivers: revision!.waivers.map(waiverWords),
    by: revision!.releasedBy?.name ?? '',
    derived: frozen.derivation.derived,
    current: revision!,
  };
}
