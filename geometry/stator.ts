import type { Design } from './design';
import type { Circle, Path, Point, Vertex } from './outline';
import { arcVertices, polar } from './polar';
import type { PostLayout } from './post';

export interface StatorOutline {
  readonly outside: Path;
  readonly holes: readonly Circle[];
}

interface Ear {
  /** Angle at which the outer arc is left and met again, either side of the post, rad. */
  readonly half: number;
  readonly vertices: readonly Vertex[];
}

/** Turns a vertex given with the post along +x to where the post stands. */
function turned(point: Point, angle: number, bulge: number): Vertex {
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  return { x: point.x * cos - point.y * sin, y: point.x * sin + point.y * cos, bulge };
}

/**
 * The ear round one post: a round boss with straight sides down to the outer arc, or the part of
 * the boss that stands out of the arc, or nothing where the post stands well inside.
 */
function ear(layout: PostLayout, statorRadius: number, angle: number): Ear | null {
  const { circleRadius: rp, earRadius: re } = layout;
  if (rp + re <= statorRadius) return null;
  const foot = Math.sqrt(Math.max(0, statorRadius ** 2 - re ** 2));
  if (rp >= foot) {
    return {
      half: Math.asin(Math.min(1, re / statorRadius)),
      vertices: [
        turned({ x: foot, y: -re }, angle, 0),
        turned({ x: rp, y: -re }, angle, 1),
        turned({ x: rp, y: re }, angle, 0),
      ],
    };
  }
  const half = Math.acos((statorRadius ** 2 + rp ** 2 - re ** 2) / (2 * statorRadius * rp));
  const meet = polar(statorRadius, -half);
  const capHalf = Math.atan2(-meet.y, meet.x - rp);
  return { half, vertices: [turned(meet, angle, Math.tan(capHalf / 2))] };
}

/**
 * The stator plate where it stands: a sector over the travel from +x counter-clockwise, with a
 * cut-out round the shaft and an ear for each post.
 *
 * @param statorRadius radius of its outer arc, mm
 */
export function statorOutline(
  design: Design,
  layout: PostLayout,
  statorRadius: number,
): StatorOutline {
  const { travel, cutoutRadius } = design;
  const vertices: Vertex[] = [{ ...polar(cutoutRadius, 0), bulge: 0 }];
  let at = 0;
  for (const angle of layout.angles) {
    const boss = ear(layout, statorRadius, angle);
    if (!boss) continue;
    vertices.push(...arcVertices(statorRadius, at, angle - boss.half - at), ...boss.vertices);
    at = angle + boss.half;
  }
  vertices.push(
    ...arcVertices(statorRadius, at, travel - at),
    { ...polar(statorRadius, travel), bulge: 0 },
    ...arcVertices(cutoutRadius, travel, -travel),
  );
  // The cut-out ends where the outline began.
  return {
    outside: { kind: 'path', vertices },
    holes: layout.angles.map((angle) => ({
      kind: 'circle',
      ...polar(layout.circleRadius, angle),
      radius: design.postHoleDiameter / 2,
    })),
  };
}
