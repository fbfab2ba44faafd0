/** What whoever cuts a sheet must know of its material, whatever the machine. */

import type { CutPart } from '../parts/part';

const BRIGHT: readonly CutPart['material'][] = ['brass', 'copper', 'aluminium'];

/** Does it throw a laser's beam back? */
export const isBright = (material: CutPart['material']): boolean => BRIGHT.includes(material);

/** Common practice of cutting shops; empty where there is nothing to say. */
export function materialCaution(material: CutPart['material']): string {
  if (material === 'insulator') {
    return 'Never laser-cut PVC or PTFE: they give off hydrogen chloride and hydrogen fluoride. Waterjet or mill glass-filled sheet.';
  }
  if (!isBright(material)) return '';
  return `Bright ${material} throws a laser beam back: only on a machine rated for it, else waterjet, etching or milling.`;
}
