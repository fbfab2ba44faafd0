/** A layout that any sheet software might give: parts in rows, box beside box, as drawn. */

import { contourBounds } from '@/geometry/measure';
import type { Placement } from '@/geometry/nesting/layout';
import type { GivenGroup } from '@/geometry/nesting/given-layout';
import type { CutPart } from '@/geometry/parts/part';

interface Room {
  readonly width: number;
  readonly height: number;
  readonly gap: number;
  readonly margin: number;
}

function rowsOf(
  parts: readonly CutPart[],
  copies: number,
  { width, height, gap, margin }: Room,
): GivenGroup {
  const placements: Placement[] = [];
  let [sheet, left, bottom, top] = [0, margin, margin, margin];
  for (const { key, outside, quantity } of parts) {
    const { minX, minY, maxX, maxY } = contourBounds(outside);
    for (let k = 0; k < quantity * copies; k++) {
      if (left + maxX - minX > width - margin) [left, bottom] = [margin, top + gap];
      if (bottom + maxY - minY > height - margin) {
        [sheet, left, bottom, top] = [sheet + 1, margin, margin, margin];
      }
      placements.push({ key, sheet, x: left - minX, y: bottom - minY, angle: 0 });
      left += maxX - minX + gap;
      top = Math.max(top, bottom + maxY - minY);
    }
  }
  const { material, thickness } = parts[0]!;
  const sheets = Array.from({ length: sheet + 1 }, () => ({ width, height }));
  return { material, thickness, sheets, placements };
}

/** All parts of some capacitors, kind of sheet by kind of sheet. mm */
export function rowLayout(parts: readonly CutPart[], copies: number, room: Room): GivenGroup[] {
  const kinds = new Map<string, CutPart[]>();
  for (const part of parts) {
    const kind = `${part.material} ${part.thickness}`;
    kinds.set(kind, [...(kinds.get(kind) ?? []), part]);
  }
  return [...kinds.values()].map((own) => rowsOf(own, copies, room));
}
