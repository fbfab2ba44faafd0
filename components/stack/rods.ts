import type { Derived } from '@/geometry';

/** A round bar along the shaft, mm. */
export interface Rod {
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  readonly from: number;
  readonly to: number;
}

/** How far the shaft stands out at either end, as a share of the stack's outer radius. */
const SHAFT_OUT = 0.35;
const POST_OUT = 0.06;

export interface StackRods {
  readonly shaft: Rod;
  readonly rotorSpacers: readonly Rod[];
  readonly statorSpacers: readonly Rod[];
  readonly posts: readonly Rod[];
}

/** Every round part of the stack. The kernel gives spacers and plates; posts span their set of plates. */
export function stackRods({ design, stack, sections }: Derived): StackRods {
  const out = SHAFT_OUT * stack.outerRadius;
  const rotorSpacers: Rod[] = [];
  const statorSpacers: Rod[] = [];
  for (const { role, section, z, length } of stack.spacers) {
    const from = z - length / 2;
    const to = z + length / 2;
    if (role === 'rotor') {
      rotorSpacers.push({ x: 0, y: 0, radius: design.spacerRadius, from, to });
    } else {
      for (const { x, y, spacerRadius } of sections[section]!.posts) {
        statorSpacers.push({ x, y, radius: spacerRadius, from, to });
      }
    }
  }
  const posts = sections.flatMap((section, index) => {
    const stators = stack.plates.filter(
      (plate) => plate.role === 'stator' && plate.section === index,
    );
    const end = POST_OUT * stack.outerRadius;
    return [...new Set(stators.map(({ pack }) => pack))].flatMap((pack) => {
      const faces = stators
        .filter((plate) => plate.pack === pack)
        .flatMap(({ z, thickness }) => [z - thickness / 2, z + thickness / 2]);
      return section.posts.map(({ x, y, holeRadius }) => ({
        x,
        y,
        radius: holeRadius,
        from: Math.min(...faces) - end,
        to: Math.max(...faces) + end,
      }));
    });
  });
  return {
    shaft: {
      x: 0,
      y: 0,
      radius: design.shaftDiameter / 2,
      from: -out,
      to: stack.depth + out,
    },
    rotorSpacers,
    statorSpacers,
    posts,
  };
}
