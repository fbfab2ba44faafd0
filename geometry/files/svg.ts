/** SVG of cut contours through makerjs, true scale in mm. */

import makerjs from 'makerjs';
import { walk, type Contour } from '../outline';
import type { Placement } from './placement';

const DEGREES = 180 / Math.PI;

/** A contour as a makerjs model of lines, arcs and circles. */
function modelOf(contour: Contour, layer: string): makerjs.IModel {
  const paths: Record<string, makerjs.IPath> = {};
  let at: [number, number] = [0, 0];
  let count = 0;
  const add = (path: makerjs.IPath): void => {
    paths[`side${++count}`] = path;
  };
  walk(contour, {
    move: (x, y) => {
      at = [x, y];
    },
    line: (x, y) => {
      add(new makerjs.paths.Line(at, [x, y]));
      at = [x, y];
    },
    arc: (x, y, centre, radius, start, sweep) => {
      const from = (sweep > 0 ? start : start + sweep) * DEGREES;
      const to = from + Math.abs(sweep) * DEGREES;
      add(new makerjs.paths.Arc([centre.x, centre.y], radius, from, to));
      at = [x, y];
    },
    circle: (x, y, radius) => add(new makerjs.paths.Circle([x, y], radius)),
    close: () => undefined,
  });
  return { layer, paths };
}

/** One SVG of the parts as placed; outer and inner cuts of each part in groups of their own. */
export function svgOf(placements: readonly Placement[]): string {
  const models: Record<string, makerjs.IModel> = {};
  for (const { part, dx, dy } of placements) {
    const { key } = part;
    const holes = part.holes.map((hole) => modelOf(hole, `${key}-inner-cut`));
    models[key] = {
      origin: [dx, dy],
      models: {
        outer: modelOf(part.outside, `${key}-outer-cut`),
        ...Object.fromEntries(holes.map((hole, i) => [`hole${i + 1}`, hole])),
      },
    };
  }
  return makerjs.exporter.toSVG(
    { models },
    {
      units: makerjs.unitType.Millimeter,
      accuracy: 1e-6,
      fill: 'none',
      stroke: '#000',
      strokeWidth: '0.1mm',
      svgAttrs: { xmlns: 'http://www.w3.org/2000/svg' },
    },
  );
}
