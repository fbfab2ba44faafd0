import { sharedParameters, type Derived } from '@/geometry';
import { drawingOf } from '@/geometry/drawing/drawing';
import { cutFiles, slugOf } from '@/geometry/files';
import { bundleOf } from './bundle';
import { sketchesPdf } from './drawing-pdf';
import type { FileNames } from './file-names';
import { hashed, type HashedFile } from './hashed-file';

/** Sheet materials as a drawing calls them. */
const materials: Readonly<Record<string, string>> = {
  ...Object.fromEntries(
    sharedParameters.material.options.map(({ value, label }) => [value, label]),
  ),
  insulator: 'Insulating sheet',
};
export const materialWords = (material: string): string => materials[material] ?? material;

function drawing(derived: Derived, names: FileNames): Promise<Uint8Array> {
  const { issued, ...rest } = names;
  const sketches = drawingOf(derived, {
    ...rest,
    issued: issued.slice(0, 10),
    materialOf: materialWords,
  });
  const { name, owner } = names;
  return sketchesPdf(sketches, { title: name, author: owner, issued: new Date(issued) });
}

/** Every file of a design. The same plates and names give the same bytes. */
export async function makeFiles(derived: Derived, names: FileNames): Promise<HashedFile[]> {
  const { name } = names;
  const files = cutFiles(name, derived).map(({ text, ...file }) =>
    hashed({ ...file, body: Buffer.from(text, 'utf8') }),
  );
  files.push(
    hashed({
      name: `${slugOf(name)}_drawing.pdf`,
      label: 'Drawing: assembly and a sheet for each part that is cut',
      kind: 'pdf',
      mediaType: 'application/pdf',
      body: await drawing(derived, names),
    }),
  );
  const bundle = bundleOf(names, derived, files);
  return [
    ...files,
    hashed({
      ...bundle,
      label: 'All files in one, with a list of their hashes',
      kind: 'zip',
      mediaType: 'application/zip',
    }),
  ];
}
