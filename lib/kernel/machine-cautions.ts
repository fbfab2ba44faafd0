import type { Machine } from '@/geometry/cutting/machine';
import { materialCaution } from '@/geometry/cutting/material-caution';
import { partFindings } from '@/geometry/cutting/part-findings';
import type { CutPart } from '@/geometry/parts/part';

/** What parts and machine say that whoever cuts must know; what simply holds is left out. */
export function machineCautions(parts: readonly CutPart[], machine: Machine): string[] {
  const said = parts
    .flatMap((part) => partFindings(part, machine))
    .filter(({ severity }) => severity !== 'ok')
    .map(({ label, change }) => `${label}. ${change}`);
  const ofMaterial = parts.map(({ material }) => materialCaution(material));
  return [...new Set([...ofMaterial, ...said])].filter(Boolean);
}
