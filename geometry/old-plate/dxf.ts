/** A DXF of an old plate: lines, arcs, circles and polylines; all else is refused with words. */

import DxfParser from 'dxf-parser';
import type { Vertex } from '../outline';
import { DrawingError, MOST_ENTITIES, MOST_VERTICES, type Drawing, type Piece } from './pieces';

interface Entity {
  readonly type: string;
  readonly vertices?: readonly { x: number; y: number; bulge?: number }[];
  readonly shape?: boolean;
  readonly center?: { x: number; y: number };
  readonly radius?: number;
  readonly startAngle?: number;
  readonly endAngle?: number;
  readonly extrusionDirection?: { z: number };
}

/** mm for each unit, by $INSUNITS of the DXF reference. */
const units: Record<number, number> = { 1: 25.4, 2: 304.8, 4: 1, 5: 10, 6: 1000 };

const IGNORED = new Set(['TEXT', 'MTEXT', 'DIMENSION', 'POINT', 'HATCH', 'LEADER']);

function pieceOf(entity: Entity, scale: number): Piece {
  const vertices = (entity.vertices ?? []).map(({ x, y, bulge }): Vertex => ({
    x: x * scale,
    y: y * scale,
    bulge: bulge ?? 0,
  }));
  return { vertices, closed: entity.shape === true };
}

function arcPiece({ center, radius, startAngle, endAngle }: Entity, scale: number): Piece {
  const from = startAngle ?? 0;
  const sweep = ((((endAngle ?? 0) - from) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
  const halves = sweep > Math.PI ? 2 : 1;
  const at = (angle: number, bulge: number): Vertex => ({
    x: (center!.x + radius! * Math.cos(angle)) * scale,
    y: (center!.y + radius! * Math.sin(angle)) * scale,
    bulge,
  });
  const step = sweep / halves;
  return {
    closed: false,
    vertices: [
      ...Array.from({ length: halves }, (_, i) => at(from + i * step, Math.tan(step / 4))),
      at(from + sweep, 0),
    ],
  };
}

export interface DxfDrawing extends Drawing {
  /** Does the file say what its unit is? */
  readonly unitKnown: boolean;
}

/**
 * @param unit mm for a unit where the file names none
 * @throws DrawingError
 */
export function readDxf(text: string, unit = 1): DxfDrawing {
  if (!/\bENTITIES\b/.test(text)) {
    throw new DrawingError(
      'This is no DXF with entities in it: save the outline as ASCII DXF.',
    );
  }
  let parsed: ReturnType<DxfParser['parseSync']>;
  try {
    parsed = new DxfParser().parseSync(text);
  } catch (error) {
    const why = error instanceof Error ? error.message : String(error);
    throw new DrawingError(
      `The DXF can't be read (${why.slice(0, 120)}): save it as ASCII DXF, 2000 or R12.`,
    );
  }
  const entities = (parsed?.entities ?? []) as unknown as Entity[];
  if (entities.length > MOST_ENTITIES) {
    throw new DrawingError(
      `The DXF has ${entities.length} entities; at most ${MOST_ENTITIES} are read. Keep only the outline of one plate.`,
    );
  }
  const named = units[Number(parsed?.header?.['$INSUNITS'] ?? 0)];
  const scale = named ?? unit;
  const pieces: Piece[] = [];
  const circles: Drawing['circles'][number][] = [];
  let count = 0;
  for (const entity of entities) {
    if (IGNORED.has(entity.type)) continue;
    if (entity.extrusionDirection && entity.extrusionDirection.z < 0) {
      throw new DrawingError(
        'The outline is drawn from behind (extrusion −z): flatten it into the plan first.',
      );
    }
    if (entity.type === 'CIRCLE') {
      const { center, radius } = entity;
      circles.push({
        kind: 'circle',
        x: center!.x * scale,
        y: center!.y * scale,
        radius: radius! * scale,
      });
    } else if (entity.type === 'ARC') pieces.push(arcPiece(entity, scale));
    else if (['LINE', 'LWPOLYLINE', 'POLYLINE'].includes(entity.type))
      pieces.push(pieceOf(entity, scale));
    else {
      throw new DrawingError(
        `${entity.type} is not read: turn it into lines and arcs (explode blocks, convert splines) and save again.`,
      );
    }
    count += pieces.at(-1)?.vertices.length ?? 0;
    if (count > MOST_VERTICES) {
      throw new DrawingError(
        `The outline has more than ${MOST_VERTICES} corners: simplify it.`,
      );
    }
  }
  const finite = [
    ...pieces.flatMap(({ vertices }) => vertices.flatMap(({ x, y, bulge }) => [x, y, bulge])),
    ...circles.flatMap(({ x, y, radius }) => [x, y, radius]),
  ];
  if (!finite.every(Number.isFinite)) {
    throw new DrawingError('The DXF has coordinates that are no numbers: export it anew.');
  }
  return { pieces, circles, unitKnown: named !== undefined };
}
