import { writeSheets } from '@/components/api/sheets';
import type { LaidOut } from '@/geometry/nesting/lay-out';
import type { WriteSheets } from '@/lib/schemas/sheets';
import type { Saved } from '../tool-props';
import type { Question } from './lay-out.worker';
import type { ShopMachine } from './use-shop';

function machineAsked({ item, ...machine }: ShopMachine): WriteSheets['machine'] {
  if (item) return { from: 'workshop', ...item };
  const { name, reflective, ...values } = machine;
  return {
    from: 'values',
    name,
    values: { ...values, reflective: reflective ? 'yes' : 'no' },
  };
}

/**
 * Has the server make the files of a layout, and hands them to the browser as a download.
 * @param only one sheet's DXF instead of everything in a ZIP
 * @throws RequestError
 */
export async function saveSheets(
  { id, version }: Saved,
  { machine, copies, settings, kerf }: Question,
  { groups }: LaidOut,
  only?: { readonly group: number; readonly sheet: number },
): Promise<void> {
  const { name, content } = await writeSheets(id, {
    version,
    machine: machineAsked(machine),
    copies,
    settings,
    kerf,
    groups: groups.map(({ material, thickness, layout: { sheets, placements } }) => ({
      material,
      thickness,
      sheets: sheets.map(({ width, height }) => ({ width, height })),
      placements: [...placements],
    })),
    ...(only && { only }),
  });
  const address = URL.createObjectURL(content);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
