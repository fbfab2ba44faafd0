import type { Stop } from './grading';
import type { Posts, StackShape } from './stack-shape';

/** Lines of the grid meet on a post's circle every 30°. */
const cuts = [-1, -Math.sqrt(3) / 2, -0.5, 0, 0.5, Math.sqrt(3) / 2, 1];
/** Step at a post over its radius. */
const step = 0.25;

export function postRadii({ posts }: StackShape): Stop[] {
  if (!posts) return [];
  return cuts.map((c) => ({ at: posts.at + c * posts.radius, step: step * posts.radius }));
}

export function postAngles({ posts }: StackShape): Stop[] {
  if (!posts) return [];
  const half = posts.radius / posts.at;
  return posts.angles.flatMap((psi) =>
    cuts.map((c) => ({ at: psi + c * half, step: step * half })),
  );
}

/** Whether a point of the plan lies in a post; the post's circle is drawn in (ρ, at·ψ). */
export function inPost(posts: Posts, rho: number, psi: number): boolean {
  return posts.angles.some(
    (angle) => Math.hypot(rho - posts.at, posts.at * (psi - angle)) <= posts.radius + 1e-9,
  );
}
