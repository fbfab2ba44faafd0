/**
 * DXF of one laid-out sheet: every cut where it lies, on layers by what it is. Contours are closed
 * LWPOLYLINEs with true arcs, or open ones between micro-bridges; lead-ins lie on a layer of their
 * own, the sheet's edge and what a person should know on layers that are not cut.
 */

import Drawing from 'dxf-writer';
import Handle from 'dxf-writer/src/Handle';
import type { CutRun, KerfState } from '../cutting/cut-path';
import type { Machine } from '../cutting/machine';
import type { LaidGroup } from '../nesting/lay-out';
import { sheetCuts } from '../nesting/sheet-cuts';
import type { Vertex } from '../outline';
import { kerfWords } from './kerf-words';

const LAYERS = {
  outer: 'OUTER-CUT',
  inner: 'INNER-CUT',
  leadIn: 'LEAD-IN',
  marking: 'MARKING',
  notes: 'NOTES',
} as const;

/** mm; far below any machine's step. */
const rounded = (value: number, digits = 6): number => Number(value.toFixed(digits)) + 0;

function polyline(drawing: Drawing, vertices: readonly Vertex[], closed: boolean): void {
  const points = vertices.map(
    ({ x, y, bulge }) => [rounded(x), rounded(y), rounded(bulge, 12)] as const,
  );
  // The library takes the bulge as a third item of a point; its types name only two.
  drawing.drawPolyline(points as unknown as [number, number][], closed);
}

function drawRun(drawing: Drawing, { edge, contour, between, leadIn }: CutRun): void {
  drawing.setActiveLayer(edge === 'outer' ? LAYERS.outer : LAYERS.inner);
  if (contour?.kind === 'circle') {
    drawing.drawCircle(rounded(contour.x), rounded(contour.y), rounded(contour.radius));
  } else if (contour) polyline(drawing, contour.vertices, true);
  else if (between) polyline(drawing, between, false);
  if (!leadIn) return;
  const { from, to } = leadIn;
  drawing.setActiveLayer(LAYERS.leadIn);
  drawing.drawLine(rounded(from.x), rounded(from.y), rounded(to.x), rounded(to.y));
}

/** What a person should know of a sheet. */
export function sheetWords(
  { material, thickness, layout }: LaidGroup,
  sheet: number,
  machine: Machine,
  state: KerfState,
): string {
  const { width, height } = layout.sheets[sheet]!;
  return `${material} ${thickness} mm, sheet ${sheet + 1} of ${layout.sheets.length}, ${width} x ${height} mm, ${machine.name}: ${kerfWords(state, machine)}`;
}

/** @param title what its notes begin with: whose sheet it is */
export function sheetDxf(
  group: LaidGroup,
  sheet: number,
  machine: Machine,
  state: KerfState,
  title = '',
): string {
  // The library counts handles over the whole process; from 0, equal sheets give equal bytes.
  Handle.seed = 0;
  const drawing = new Drawing();
  drawing.setUnits('Millimeters');
  drawing.header('MEASUREMENT', [[70, 1]]);
  for (const layer of Object.values(LAYERS)) {
    drawing.addLayer(layer, Drawing.ACI.LAYER, 'CONTINUOUS');
  }
  for (const { runs } of sheetCuts(group, sheet, machine, state)) {
    for (const run of runs) drawRun(drawing, run);
  }
  const { width, height } = group.layout.sheets[sheet]!;
  drawing.setActiveLayer(LAYERS.marking);
  polyline(
    drawing,
    [
      { x: 0, y: 0, bulge: 0 },
      { x: width, y: 0, bulge: 0 },
      { x: width, y: height, bulge: 0 },
      { x: 0, y: height, bulge: 0 },
    ],
    true,
  );
  drawing.setActiveLayer(LAYERS.notes);
  drawing.drawText(0, -8, 4, 0, title + sheetWords(group, sheet, machine, state));
  return drawing.toDxfString();
}
