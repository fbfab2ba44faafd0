import 'server-only';
import type { Derived } from '@/geometry';
import { mayDownload, requireMember } from './access';
import { notFound } from './errors';
import { filePartsOf } from './kernel/file-parts';
import type { HashedFile } from './kernel/hashed-file';
import { derivePlates, makeFiles } from './kernel/kernel';
import { materialWords } from './kernel/make-files';
import { findDesign } from './queries';
import { NOT_RELEASED } from './revisions/freeze';
import type { DesignFiles, DesignRecord } from './schemas/api';

/** Every file of a stored version, as it would be downloaded. The same version, the same bytes. */
export function hashedFiles(
  stored: DesignRecord,
  owner: string,
  derived: Derived,
): Promise<HashedFile[]> {
  const { id, name, version, updatedAt, updatedBy, design } = stored;
  return makeFiles(design, derived, {
    name,
    owner,
    number: id.slice(0, 8).toUpperCase(),
    revision: `v${version}`,
    issued: updatedAt,
    creator: updatedBy.name,
    approved: '',
    status: NOT_RELEASED,
    waivers: [],
  });
}

/** What can be downloaded of a design. @throws RequestError not-found or checks-fail. */
export async function listFiles(id: string): Promise<DesignFiles> {
  const viewer = await requireMember(mayDownload);
  const stored = await findDesign(viewer, id);
  if (!stored) throw notFound();
  const derived = await derivePlates(stored.design);
  const files = await hashedFiles(stored, viewer.workshopName, derived);
  return {
    version: stored.version,
    files: files.map(({ name, label, kind, body, sha256 }) => ({
      name,
      label,
      kind,
      bytes: body.byteLength,
      sha256,
    })),
    parts: filePartsOf(stored.name, derived, materialWords),
  };
}
