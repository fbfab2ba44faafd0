/**
 * An SVG of an old plate: paths, polygons, lines, rectangles without round corners, and circles.
 * Tags are read by themselves, without references, entities, styles or scripts; path data by
 * makerjs. y runs upwards in what is given back.
 */

import makerjs from 'makerjs';
import type { Circle, Vertex } from '../outline';
import { DrawingError, MOST_ENTITIES, type Drawing, type Piece } from './pieces';

type Attributes = Readonly<Record<string, string>>;

/** x′ = a·x + c·y + e, y′ = b·x + d·y + f. */
type Matrix = readonly [number, number, number, number, number, number];

const IDENTITY: Matrix = [1, 0, 0, 1, 0, 0];

const DEEPEST = 50;
const LONGEST_PATH = 200_000;

/** mm for each unit of length (CSS: 96 px to the inch). */
const units: Record<string, number> = {
  mm: 1,
  cm: 10,
  in: 25.4,
  pt: 25.4 / 72,
  pc: 25.4 / 6,
  px: 25.4 / 96,
  '': 25.4 / 96,
};

const REFUSED = /^(use|image|foreignobject|script|symbol|marker|pattern|text|tspan|textpath)$/;

const times = (m: Matrix, n: Matrix): Matrix => [
  m[0] * n[0] + m[2] * n[1],
  m[1] * n[0] + m[3] * n[1],
  m[0] * n[2] + m[2] * n[3],
  m[1] * n[2] + m[3] * n[3],
  m[0] * n[4] + m[2] * n[5] + m[4],
  m[1] * n[4] + m[3] * n[5] + m[5],
];

function transformOf(text: string | undefined): Matrix {
  let matrix = IDENTITY;
  for (const [, name, list] of (text ?? '').matchAll(/(\w+)\s*\(([^)]*)\)/g)) {
    const [a = 0, b = 0, c = 0, d = 0, e = 0, f = 0] = list!
      .split(/[\s,]+/)
      .filter(Boolean)
      .map(Number);
    const count = list!.split(/[\s,]+/).filter(Boolean).length;
    const angle = (a * Math.PI) / 180;
    const turn: Matrix = [
      Math.cos(angle),
      Math.sin(angle),
      -Math.sin(angle),
      Math.cos(angle),
      0,
      0,
    ];
    if (name === 'translate') matrix = times(matrix, [1, 0, 0, 1, a, b]);
    else if (name === 'scale') matrix = times(matrix, [a, 0, 0, count > 1 ? b : a, 0, 0]);
    else if (name === 'matrix') matrix = times(matrix, [a, b, c, d, e, f]);
    else if (name === 'rotate') {
      matrix = times(times(times(matrix, [1, 0, 0, 1, b, c]), turn), [1, 0, 0, 1, -b, -c]);
    } else
      throw new DrawingError(
        `The transform “${name}” is not read: apply it to the outline first.`,
      );
  }
  return matrix;
}

/** The matrix's scale; unequal ones would make ellipses of arcs. */
function scaleOf([a, b, c, d]: Matrix): number {
  const [x, y] = [Math.hypot(a, b), Math.hypot(c, d)];
  if (Math.abs(x - y) > 1e-6 * x || Math.abs(a * c + b * d) > 1e-6 * x * y) {
    throw new DrawingError(
      'The outline is stretched or sheared by a transform: apply it first.',
    );
  }
  return x;
}

function attributesOf(text: string): Attributes {
  const found: Record<string, string> = {};
  for (const [, name, , double, single] of text.matchAll(
    /([\w:-]+)\s*=\s*("([^"]*)"|'([^']*)')/g,
  )) {
    found[name!.toLowerCase()] = double ?? single ?? '';
  }
  return found;
}

function lengthOf(text: string | undefined, per: number): number {
  const match = /^\s*([-+]?[\d.]+(?:e[-+]?\d+)?)\s*([a-z%]*)\s*$/i.exec(text ?? '0');
  if (!match) throw new DrawingError(`“${(text ?? '').slice(0, 20)}” is no length.`);
  const unit = match[2]!.toLowerCase();
  if (unit === '') return Number(match[1]);
  const mm = units[unit];
  if (mm === undefined)
    throw new DrawingError(`The unit “${unit}” is not read: use mm, cm, in or px.`);
  return (Number(match[1]) * mm) / per;
}

/** mm for a user unit, and the matrix from user units to mm with y upwards. */
function pageOf(svg: Attributes): { readonly per: number; readonly matrix: Matrix } {
  const box = svg['viewbox']
    ?.split(/[\s,]+/)
    .filter(Boolean)
    .map(Number);
  const width = svg['width'];
  let per = units['']!;
  if (box && box.length === 4 && width && !width.includes('%')) {
    per = lengthOf(/[a-z]/i.test(width) ? width : `${width}px`, 1) / box[2]!;
  }
  if (!Number.isFinite(per) || per <= 0)
    throw new DrawingError('The SVG says no usable size: give width and viewBox.');
  return { per, matrix: [per, 0, 0, -per, 0, 0] };
}

function pathPieces(data: string): Piece[] {
  if (data.length > LONGEST_PATH)
    throw new DrawingError('A path is too long to be read: simplify it.');
  const model = makerjs.importer.fromSVGPathData(data);
  const pieces: Piece[] = [];
  const bulgeOf = ({
    startAngle,
    endAngle,
  }: {
    startAngle: number;
    endAngle: number;
  }): number => {
    const sweep = (((endAngle - startAngle) % 360) + 360) % 360;
    return Math.tan((sweep * Math.PI) / 720);
  };
  makerjs.model.walk(model, {
    onPath: ({ pathContext, offset }) => {
      const [ox, oy] = offset as [number, number];
      const ends = makerjs.point.fromPathEnds(pathContext);
      if (!ends) return;
      const [from, to] = ends as [[number, number], [number, number]];
      const at = ([x, y]: [number, number], bulge: number): Vertex => ({
        x: x + ox,
        y: -(y + oy),
        bulge,
      });
      // makerjs has y upwards; back to the file's downward y, which turns arcs round.
      const bulge = pathContext.type === 'arc' ? -bulgeOf(pathContext as makerjs.IPathArc) : 0;
      pieces.push({ closed: false, vertices: [at(from, bulge), at(to, 0)] });
    },
  });
  return pieces;
}

const numbers = (text: string | undefined): number[] =>
  (text ?? '')
    .split(/[\s,]+/)
    .filter(Boolean)
    .map(Number);

function polygon(values: readonly number[], closed: boolean): Piece {
  const vertices = Array.from({ length: values.length >> 1 }, (_, i) => ({
    x: values[2 * i]!,
    y: values[2 * i + 1]!,
    bulge: 0,
  }));
  return { vertices, closed };
}

/** @throws DrawingError */
export function readSvg(text: string): Drawing {
  if (!/<svg[\s>]/i.test(text))
    throw new DrawingError('This is no SVG: save the outline as plain SVG.');
  if (/<!ENTITY|<!DOCTYPE[^>]*\[/i.test(text)) {
    throw new DrawingError(
      'The SVG defines entities, which are not read: save it as plain SVG.',
    );
  }
  const pieces: Piece[] = [];
  const circles: Circle[] = [];
  const matrices: Matrix[] = [IDENTITY];
  let per = units['']!;
  let hidden = 0;
  let count = 0;
  const plain = text.replace(/<!--[\s\S]*?-->/g, '');
  for (const [, closing, rawName, rest, selfClosing] of plain.matchAll(
    /<(\/?)([a-z][\w:-]*)((?:\s+[\w:-]+\s*=\s*(?:"[^"]*"|'[^']*'))*)\s*(\/?)>/gi,
  )) {
    const name = rawName!.toLowerCase().replace(/^svg:/, '');
    if ((count += 1) > MOST_ENTITIES) {
      throw new DrawingError(
        `The SVG has more than ${MOST_ENTITIES} elements: keep only the outline of one plate.`,
      );
    }
    const container = [
      'svg',
      'g',
      'a',
      'defs',
      'clippath',
      'mask',
      'metadata',
      'title',
      'desc',
      'style',
    ].includes(name);
    if (closing) {
      if (container) {
        matrices.pop();
        if (['defs', 'clippath', 'mask'].includes(name)) hidden -= 1;
      }
      continue;
    }
    if (REFUSED.test(name)) {
      throw new DrawingError(
        `<${name}> is not read: turn everything into plain paths and save again.`,
      );
    }
    const attributes = attributesOf(rest!);
    let matrix = times(matrices.at(-1) ?? IDENTITY, transformOf(attributes['transform']));
    if (name === 'svg' && matrices.length === 1) {
      const page = pageOf(attributes);
      per = page.per;
      matrix = times(page.matrix, matrix);
    }
    if (container) {
      if (!selfClosing) {
        matrices.push(matrix);
        if (['defs', 'clippath', 'mask'].includes(name)) hidden += 1;
        if (matrices.length > DEEPEST)
          throw new DrawingError(`The SVG is nested more than ${DEEPEST} deep: ungroup it.`);
      }
      continue;
    }
    if (hidden > 0) continue;
    const scale = scaleOf(matrix);
    const length = (key: string): number => lengthOf(attributes[key], per);
    const flips = matrix[0] * matrix[3] - matrix[1] * matrix[2] < 0;
    const [a, b, c, d, e, f] = matrix;
    const place = (piece: Piece): Piece => ({
      closed: piece.closed,
      vertices: piece.vertices.map(({ x, y, bulge }) => ({
        x: a * x + c * y + e,
        y: b * x + d * y + f,
        bulge: flips ? -bulge : bulge,
      })),
    });
    if (name === 'circle') {
      const [x, y] = [length('cx'), length('cy')];
      circles.push({
        kind: 'circle',
        x: a * x + c * y + e,
        y: b * x + d * y + f,
        radius: length('r') * scale,
      });
    } else if (name === 'path') pieces.push(...pathPieces(attributes['d'] ?? '').map(place));
    else if (name === 'polygon' || name === 'polyline') {
      pieces.push(place(polygon(numbers(attributes['points']), name === 'polygon')));
    } else if (name === 'line') {
      pieces.push(
        place(polygon([length('x1'), length('y1'), length('x2'), length('y2')], false)),
      );
    } else if (name === 'rect') {
      const [x, y, w, h] = [length('x'), length('y'), length('width'), length('height')];
      pieces.push(place(polygon([x, y, x + w, y, x + w, y + h, x, y + h], true)));
    } else if (name === 'ellipse') {
      throw new DrawingError('<ellipse> is not read: turn it into a circle or a path of arcs.');
    }
  }
  const all = [
    ...pieces.flatMap(({ vertices }) => vertices.flatMap(({ x, y, bulge }) => [x, y, bulge])),
    ...circles.flatMap(({ x, y, radius }) => [x, y, radius]),
  ];
  if (!all.every(Number.isFinite))
    throw new DrawingError('The SVG has coordinates that are no numbers.');
  return { pieces, circles };
}
