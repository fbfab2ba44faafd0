import 'server-only';
import { createHash } from 'node:crypto';
import { sharedParameters, type Derived, type Design } from '@/geometry';
import { drawingOf } from '@/geometry/drawing/drawing';
import { cutFiles, slugOf, type CutFile } from '@/geometry/files';
import { mayDownload, requireMember } from './access';
import { describeFailure } from './assess-design';
import { bundleOf } from './bundle';
import { deriveDesign } from './derive-design';
import { notFound, RequestError } from './errors';
import { filePartsOf } from './file-parts';
import { findDesign } from './queries';
import { sketchesPdf } from './drawing-pdf';
import type { DesignFiles, DesignRecord } from './schemas/api';

export interface HashedFile {
  readonly name: string;
  /** What it holds, for a person. */
  readonly label: string;
  readonly kind: CutFile['kind'] | 'pdf' | 'zip';
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

/** Sheet materials as a drawing calls them. */
const materials: Readonly<Record<string, string>> = {
  ...Object.fromEntries(
    sharedParameters.material.options.map(({ value, label }) => [value, label]),
  ),
  insulator: 'Insulating sheet',
};
const materialWords = (material: string): string => materials[material] ?? material;

/** The drawing of a stored version: the same version gives the same bytes. */
function drawingFile(stored: DesignRecord, owner: string, derived: Derived): Promise<Buffer> {
  const { id, name, version, updatedAt, updatedBy } = stored;
  const sketches = drawingOf(derived, {
    name,
    owner,
    number: id.slice(0, 8).toUpperCase(),
    revision: String(version),
    issued: updatedAt.slice(0, 10),
    creator: updatedBy.name,
    approved: '',
    materialOf: materialWords,
  });
  return sketchesPdf(sketches, { title: name, author: owner, issued: new Date(updatedAt) });
}

/** Files made last, by design, version and workshop: a list is followed by downloads. */
const lately = new Map<string, Promise<HashedFile[]>>();
const KEPT = 16;

/** Every file of a stored version, as it would be downloaded. */
export function hashedFiles(
  stored: DesignRecord,
  owner: string,
  derived: Derived,
): Promise<HashedFile[]> {
  const key = JSON.stringify([
    stored.id,
    stored.version,
    stored.updatedAt,
    owner,
    derived.kernel,
  ]);
  const made = lately.get(key) ?? makeFiles(stored, owner, derived);
  lately.delete(key);
  lately.set(key, made);
  made.catch(() => lately.delete(key));
  if (lately.size > KEPT) lately.delete(lately.keys().next().value!);
  return made;
}

async function makeFiles(
  stored: DesignRecord,
  owner: string,
  derived: Derived,
): Promise<HashedFile[]> {
  const { name } = stored;
  const files = cutFiles(name, derived).map(({ text, ...file }): HashedFile => {
    const body = Buffer.from(text, 'utf8');
    return { ...file, body, sha256: hashOf(body) };
  });
  const drawing = await drawingFile(stored, owner, derived);
  files.push({
    name: `${slugOf(name)}_drawing.pdf`,
    label: 'Drawing: assembly and a sheet for each part that is cut',
    kind: 'pdf',
    mediaType: 'application/pdf',
    body: drawing,
    sha256: hashOf(drawing),
  });
  const bundle = bundleOf(name, stored.version, derived, files);
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
  const derived = derivePlates(stored.design);
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
