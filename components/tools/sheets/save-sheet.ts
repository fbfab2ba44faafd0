import type { KerfState } from '@/geometry/cutting/cut-path';
import type { Machine } from '@/geometry/cutting/machine';
import { sheetDxf } from '@/geometry/files/sheet-dxf';
import type { LaidGroup } from '@/geometry/nesting/lay-out';

/** Hands a laid-out sheet to the browser as a DXF download. */
export function saveSheet(
  group: LaidGroup,
  sheet: number,
  machine: Machine,
  kerf: KerfState,
): void {
  const text = sheetDxf(group, sheet, machine, kerf);
  const address = URL.createObjectURL(new Blob([text], { type: 'image/vnd.dxf' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = `sheet-${sheet + 1}_${group.material}_${group.thickness.toFixed(2)}mm_${kerf}.dxf`;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
