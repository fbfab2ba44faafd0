import 'server-only';
import { createHash } from 'node:crypto';
import type { Derived, Design } from '@/geometry';
import { cutFiles, type CutFile } from '@/geometry/files';
import { mayDownload, requireMember } from './access';
import { describeFailure } from './assess-design';
import { bundleOf } from './bundle';
import { deriveDesign } from './derive-design';
import { notFound, RequestError } from './errors';
import { findDesign } from './queries';
import type { DesignFiles } from './schemas/api';

export interface HashedFile {
  readonly name: string;
  /** What it holds, for a person. */
  readonly label: string;
  readonly kind: CutFile['kind'] | 'zip';
  readonly mediaType: string;
  readonly body: Buffer;
  readonly sha256: string;
}

const hashOf = (body: Buffer): string => createHash('sha256').update(body).digest('hex');

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
  const files = cutFiles(name, derived).map(({ text, ...file }): HashedFile => {
    const body = Buffer.from(text, 'utf8');
    return { ...file, body, sha256: hashOf(body) };
  });
  const bundle = bundleOf(name, derived, files);
  return [
    ...files,
    {
      ...bundle,
      label: 'All files in one, with a list of their hashes',
      kind: 'zip',
      mediaType: 'application/zip',
      sha256: hashOf(bundle.body),
    },
  ];
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
