import { readDxf } from '@/geometry/old-plate/dxf';
import {
  DrawingError,
  LARGEST_FILE,
  outlinesIn,
  type Outlines,
} from '@/geometry/old-plate/pieces';
import { readSvg } from '@/geometry/old-plate/svg';
import { plateAmong } from '@/geometry/old-plate/vane';
import type { Circle, Path } from '@/geometry';

export interface OldOutline {
  readonly name: string;
  readonly plate: Path;
  /** Holes and other circles: the shaft's hole is among them. */
  readonly circles: readonly Circle[];
  /** False where a DXF names no unit: then it was taken as asked. */
  readonly unitKnown: boolean;
}

/** Reads an untrusted file in the browser. @throws DrawingError */
export async function readOutline(file: File, unit: number): Promise<OldOutline> {
  if (file.size > LARGEST_FILE) {
    throw new DrawingError(
      `${file.name} has ${file.size} bytes; at most ${LARGEST_FILE} are read. Keep only the outline of one plate.`,
    );
  }
  const text = await file.text();
  const svg = /\.svg$/i.test(file.name) || /^\s*(<\?xml|<svg)/i.test(text);
  const drawing = svg ? { ...readSvg(text), unitKnown: true } : readDxf(text, unit);
  const { paths, circles }: Outlines = outlinesIn(drawing);
  return { name: file.name, plate: plateAmong(paths), circles, unitKnown: drawing.unitKnown };
}
