import 'server-only';
import { createHash } from 'node:crypto';
import type { Derived, Design } from '@/geometry';
import { cutFiles, type CutFile } from '@/geometry/files';
import { mayDownload, requireMember } from './access';
import { describeFailure } from './assess-design';
import { deriveDesign } from './derive-design';
import { notFound, RequestError } from './errors';
import { findDesign } from './queries';
import type { DesignFiles } from './schemas/api';

export interface HashedFile extends CutFile {
  readonly body: Buffer;
  readonly sha256: string;
}

/** The plates of a design. @throws RequestError checks-fail when it has none. */
export function derivePlates(design: Design): Derived {
  const derivation = deriveDesign(design);
  if (derivation.ok) return derivation.derived;
  const failing = derivation.findings.find(({ severity }) => severity === 'fail');
  throw new RequestError(
    'checks-fail',
    `This design has no plates to cut.${failing ? ` ${describeFailure(failing)}` : ''}`,
  );
}

/** Every file of a design, as it would be downloaded. */
export function hashedFiles(name: string, derived: Derived): HashedFile[] {
  return cutFiles(name, derived).map((file) => {
    const body = Buffer.from(file.text, 'utf8');
    return { ...file, body, sha256: createHash('sha256').update(body).digest('hex') };
  });
}

/** What can be downloaded of a design. @throws RequestError not-found or checks-fail. */
export async function listFiles(id: string): Promise<DesignFiles> {
  const viewer = await requireMember(mayDownload);
  const stored = await findDesign(viewer, id);
  if (!stored) throw notFound();
  const files = hashedFiles(stored.name, derivePlates(stored.design));
  return {
    version: stored.version,
    files: files.map(({ name, label, kind, body, sha256 }) => ({
      name,
      label,
      kind,
      bytes: body.byteLength,
      sha256,
    })),
  };
}
