import type { Derived } from '@/geometry';
import { slugOf } from '@/geometry/files';
import { partsOf } from '@/geometry/parts/assembly';
import type { HashedFile } from './hashed-file';
import type { FileNames } from './file-names';
import { zipOf } from './zip';

/** What the files hold, for a person and for a program. */
function manifestOf(
  { name, revision, status, waivers, approved }: FileNames,
  derived: Derived,
  files: readonly HashedFile[],
): string {
  const parts = partsOf(derived);
  return `${JSON.stringify(
    {
      design: name,
      revision,
      status,
      ...(approved && { approved }),
      ...(waivers.length > 0 && { releasedInSpiteOf: waivers }),
      kernel: derived.kernel,
      units: 'mm',
      kerf: 'nominal: no kerf is added or taken off',
      files: files.map((file) => {
        const part = parts.find(
          ({ key, kind }) => kind === 'cut' && file.name.includes(`_${key}_`),
        );
        return {
          file: file.name,
          what: file.label,
          ...(part?.kind === 'cut' && {
            part: part.key,
            quantity: part.quantity,
            material: part.material,
            thickness: part.thickness,
          }),
          sha256: file.sha256,
        };
      }),
    },
    null,
    2,
  )}\n`;
}

/** All files of a design in one, with a manifest that names each by its hash. */
export function bundleOf(
  names: FileNames,
  derived: Derived,
  files: readonly HashedFile[],
): { readonly name: string; readonly body: Buffer } {
  const folder = slugOf(names.name);
  const manifest = Buffer.from(manifestOf(names, derived, files), 'utf8');
  return {
    name: `${folder}_all-files.zip`,
    body: zipOf(folder, [{ name: 'manifest.json', body: manifest }, ...files]),
  };
}
