import 'server-only';
import type { Derived } from '@/geometry';
import { partFindings } from '@/geometry/cutting/part-findings';
import { kerfWords } from '@/geometry/files/kerf-words';
import { sheetCutFiles, type SheetFile, type SheetNames } from '@/geometry/files/sheet-files';
import { slugOf } from '@/geometry/files';
import { heldLayout, LayoutError, type GivenLayout } from '@/geometry/nesting/given-layout';
import type { LaidGroup } from '@/geometry/nesting/lay-out';
import { partsOf } from '@/geometry/parts/assembly';
import { RequestError } from './errors';
import { hashOf, type HashedFile } from './kernel/hashed-file';
import { zipOf } from './kernel/zip';

function hashed({ name, label, kind, mediaType, text }: SheetFile): HashedFile {
  const body = Buffer.from(text, 'utf8');
  return { name, label, kind, mediaType, body, sha256: hashOf(body) };
}

/** Names with what the manifest says of the plates' release. */
type MarkedNames = SheetNames & {
  readonly status: string;
  readonly waivers: readonly string[];
};

/** The layout with the plates' own parts in it. @throws RequestError bad-input */
function checkLayout(derived: Derived, given: GivenLayout): LaidGroup[] {
  const parts = partsOf(derived).filter((part) => part.kind === 'cut');
  try {
    return heldLayout(parts, given);
  } catch (error) {
    if (error instanceof LayoutError) throw new RequestError('bad-input', error.message);
    throw error;
  }
}

function manifestOf(
  derived: Derived,
  names: MarkedNames,
  { machine, kerf, copies, settings }: GivenLayout,
  groups: readonly LaidGroup[],
  files: readonly (readonly [SheetFile, HashedFile])[],
): string {
  const findings = groups.flatMap(({ parts }) =>
    parts.flatMap((part) => partFindings(part, machine)),
  );
  return `${JSON.stringify(
    {
      design: names.design,
      revision: names.revision,
      status: names.status,
      ...(names.waivers.length > 0 && { releasedInSpiteOf: names.waivers }),
      kernel: derived.kernel,
      units: 'mm',
      kerf: `${kerf}: ${kerfWords(kerf, machine)}`,
      machine: { name: machine.name, process: machine.process, kerf: machine.kerf },
      capacitors: copies,
      gap: settings.gap,
      margin: settings.margin,
      checksNotHeld: findings
        .filter(({ severity }) => severity !== 'ok')
        .map(({ label, change }) => `${label}. ${change}`),
      files: files.map(([{ pieces, material, thickness, sheet }, { name, label, sha256 }]) => ({
        file: name,
        what: label,
        ...(sheet === null ? pieces[0] : { sheet, pieces }),
        material,
        thickness,
        kerf,
        sha256,
      })),
    },
    null,
    2,
  )}\n`;
}

/**
 * DXF and SVG of each part and each sheet in the layout's state of kerf, and a manifest with the
 * hash of each. The same plates and layout give the same bytes.
 * @throws RequestError bad-input when the layout does not hold
 */
export function sheetFiles(
  derived: Derived,
  names: MarkedNames,
  given: GivenLayout,
): HashedFile[] {
  const groups = checkLayout(derived, given);
  const files = sheetCutFiles(names, groups, given).map(
    (file) => [file, hashed(file)] as const,
  );
  const body = Buffer.from(manifestOf(derived, names, given, groups, files), 'utf8');
  const manifest: HashedFile = {
    name: 'manifest.json',
    label: 'What each file holds, with its hash',
    kind: 'json',
    mediaType: 'application/json',
    body,
    sha256: hashOf(body),
  };
  return [...files.map(([, file]) => file), manifest];
}

/** The same files in one ZIP. */
export function sheetBundle(
  { design, revision }: SheetNames,
  kerf: GivenLayout['kerf'],
  files: readonly HashedFile[],
): HashedFile {
  const base = `${slugOf(design)}_${slugOf(revision)}_sheets_${kerf}`;
  const body = zipOf(base, files);
  return {
    name: `${base}.zip`,
    label: `Sheets and parts, ${kerf}`,
    kind: 'zip',
    mediaType: 'application/zip',
    body,
    sha256: hashOf(body),
  };
}

/** The DXF of one sheet of them, counted from 0; undefined where there is none. */
export function sheetAlone(
  derived: Derived,
  names: SheetNames,
  given: GivenLayout,
  { group, sheet }: { readonly group: number; readonly sheet: number },
): HashedFile | undefined {
  const groups = checkLayout(derived, given);
  const asked = groups[group];
  if (!asked) return undefined;
  const file = sheetCutFiles(names, [asked], given).find(
    (one) => one.kind === 'dxf' && one.sheet === sheet + 1,
  );
  return file && hashed(file);
}
