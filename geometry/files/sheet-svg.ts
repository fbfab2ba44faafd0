/** SVG of one laid-out sheet at true scale: every cut where it lies, in groups by what it is. mm */

import type { CutRun, KerfState } from '../cutting/cut-path';
import type { Machine } from '../cutting/machine';
import type { LaidGroup } from '../nesting/lay-out';
import { sheetCuts } from '../nesting/sheet-cuts';
import { line, outline } from '../sketch/sketch';
import { escaped } from '../sketch/svg';

interface Layers {
  outer: string;
  inner: string;
  leadIn: string;
}

function addRun(layers: Layers, { edge, contour, between, leadIn }: CutRun, top: number): void {
  const at = { x: 0, y: top, scale: 1 };
  if (contour) layers[edge] += outline(contour, at, 0).path;
  else if (between) {
    const closed = outline({ kind: 'path', vertices: between }, at, 0).path;
    // Between bridges a cut stays open: without the side that goes back to where it began.
    layers[edge] += closed.slice(0, closed.lastIndexOf('L'));
  }
  if (!leadIn) return;
  const { from, to } = leadIn;
  layers.leadIn += line(from.x, top - from.y, to.x, top - to.y, 0).path;
}

/** @param words what a person should know of it */
export function sheetSvg(
  group: LaidGroup,
  sheet: number,
  machine: Machine,
  state: KerfState,
  words: string,
): string {
  const { width, height } = group.layout.sheets[sheet]!;
  const layers: Layers = { outer: '', inner: '', leadIn: '' };
  for (const { runs } of sheetCuts(group, sheet, machine, state)) {
    for (const run of runs) addRun(layers, run, height);
  }
  const layer = (id: string, path: string): string => `<path id="${id}" d="${path}"/>`;
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}mm" height="${height}mm" viewBox="0 0 ${width} ${height}">`,
    `<title>${escaped(words)}</title>`,
    '<g fill="none" stroke="#000" stroke-width="0.1">',
    layer('inner-cut', layers.inner),
    layer('outer-cut', layers.outer),
    layer('lead-in', layers.leadIn),
    layer('marking', `M0 0h${width}v${height}h${-width}z`),
    '</g></svg>\n',
  ].join('');
}
