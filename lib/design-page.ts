import 'server-only';
import type { Derivation } from '@/geometry';
import { mayEdit, type Viewer } from './access';
import { listFiles } from './design-files';
import { RequestError } from './errors';
import { deriveDesign } from './kernel/kernel';
import { findDesign } from './queries';
import { derivationOf, findReleased, revisionFiles } from './revisions/queries';
import { releasedRecord } from './revisions/released-record';
import type { DesignFiles, DesignRecord } from './schemas/api';
import type { Revision } from './schemas/revision';

/** A design as its page shows it. */
export interface DesignPage {
  readonly record: DesignRecord;
  readonly derivation: Derivation;
  /** Null where there are none to cut from. */
  readonly files: DesignFiles | null;
  /** The revision that it is, for those who see no draft. */
  readonly revision: Revision | null;
}

/** A design without plates has no files; its screen asks again and says why. */
function noFiles(error: unknown): null {
  if (error instanceof RequestError && error.code === 'checks-fail') return null;
  throw error;
}

/**
 * What a person sees of a design: those who may edit what is saved, others what is released, as it
 * was frozen. Null where there is nothing for them.
 */
export async function designPage(viewer: Viewer, id: string): Promise<DesignPage | null> {
  if (mayEdit(viewer.role)) {
    const record = await findDesign(viewer, id);
    if (!record) return null;
    return {
      record,
      derivation: await deriveDesign(record.design),
      files: await listFiles(id).catch(noFiles),
      revision: null,
    };
  }
  const revision = await findReleased(viewer, id);
  const frozen = revision && (await derivationOf(viewer, revision.id));
  if (!frozen) return null;
  return {
    record: releasedRecord(revision!, frozen.design),
    derivation: frozen.derivation,
    files: revision!.state === 'released' ? await revisionFiles(viewer, revision!.id) : null,
    revision,
  };
}

/** Its name, or null; for the title of a page. */
export async function designName(viewer: Viewer, id: string): Promise<string | null> {
  if (mayEdit(viewer.role)) return (await findDesign(viewer, id))?.name ?? null;
  return (await findReleased(viewer, id))?.designName ?? null;
}
