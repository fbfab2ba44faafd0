/** What a drawing is made of, whatever file it came in: sides with bulges, and circles. mm. */

import { arcOf, type Circle, type Path, type Point, type Vertex } from '../outline';

/** A chain of sides; the last vertex is its end. */
export interface Piece {
  readonly vertices: readonly Vertex[];
  readonly closed: boolean;
}

export interface Drawing {
  readonly pieces: readonly Piece[];
  readonly circles: readonly Circle[];
}

/** A file that can't be read; the message says what is wrong and what would work. */
export class DrawingError extends Error {
  override readonly name = 'DrawingError';
}

/** Limits of what is read from a file of unknown making. */
export const LARGEST_FILE = 2_000_000;
export const MOST_ENTITIES = 5000;
export const MOST_VERTICES = 50_000;

/** mm. Ends nearer than this are joined. */
const JOIN = 0.02;

const apart = (a: Point, b: Point): number => Math.hypot(a.x - b.x, a.y - b.y);

function reversed({ vertices, closed }: Piece): Piece {
  const n = vertices.length;
  return {
    closed,
    vertices: vertices.map((_, i) => ({
      ...vertices[n - 1 - i]!,
      bulge: i === n - 1 ? 0 : -vertices[n - 2 - i]!.bulge,
    })),
  };
}

/** Joins pieces end to end into closed paths. @throws DrawingError where ends stay open */
function closedPaths(pieces: readonly Piece[]): Path[] {
  const paths: Path[] = [];
  const open: Piece[] = [];
  for (const piece of pieces) {
    if (piece.vertices.length < 2) continue;
    if (piece.closed) paths.push({ kind: 'path', vertices: piece.vertices });
    else open.push(piece);
  }
  while (open.length > 0) {
    let chain = open.pop()!;
    for (;;) {
      const end = chain.vertices.at(-1)!;
      if (apart(end, chain.vertices[0]!) < JOIN && chain.vertices.length > 2) {
        paths.push({ kind: 'path', vertices: chain.vertices.slice(0, -1) });
        break;
      }
      const next = open.findIndex(
        ({ vertices }) =>
          apart(vertices[0]!, end) < JOIN || apart(vertices.at(-1)!, end) < JOIN,
      );
      if (next < 0) {
        throw new DrawingError(
          `An outline is open at ${end.x.toFixed(2)}, ${end.y.toFixed(2)} mm: close it, or take away what is not the plate. Ends nearer than ${JOIN} mm are joined.`,
        );
      }
      const [found] = open.splice(next, 1);
      const turned = apart(found!.vertices[0]!, end) < JOIN ? found! : reversed(found!);
      chain = {
        closed: false,
        vertices: [
          ...chain.vertices.slice(0, -1),
          { ...end, bulge: turned.vertices[0]!.bulge },
          ...turned.vertices.slice(1),
        ],
      };
    }
  }
  return paths;
}

/** mm. Arcs whose centres and radii agree this well are one circle. */
const SAME = 0.01;

/** The circle that a path of nothing but arcs about one centre is, or null. */
function circleOf({ vertices }: Path): Circle | null {
  const arcs = vertices.map((a, i) =>
    a.bulge === 0 ? null : arcOf(a, vertices[(i + 1) % vertices.length]!, a.bulge),
  );
  const [first] = arcs;
  if (!first) return null;
  const one = arcs.every(
    (arc) =>
      arc !== null &&
      apart(arc.centre, first.centre) < SAME &&
      Math.abs(arc.radius - first.radius) < SAME,
  );
  return one ? { kind: 'circle', ...first.centre, radius: first.radius } : null;
}

export interface Outlines {
  readonly paths: readonly Path[];
  readonly circles: readonly Circle[];
}

/** The closed outlines of a drawing, circles apart. @throws DrawingError where one stays open */
export function outlinesIn({ pieces, circles }: Drawing): Outlines {
  const paths: Path[] = [];
  const all = [...circles];
  for (const path of closedPaths(pieces)) {
    const circle = circleOf(path);
    if (circle) all.push(circle);
    else paths.push(path);
  }
  return { paths, circles: all };
}
