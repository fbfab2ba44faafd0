import { cases, type Case } from './cases';
import type { Posts } from './stack-shape';

/** Three posts of radius 1.5 gaps, six gaps outside the rotor, over the stator's half turn. */
function postsRound(rotorRadius: number): Posts {
  return {
    radius: 1.5,
    at: rotorRadius + 6,
    angles: [30, 90, 150].map((a) => (a * Math.PI) / 180),
  };
}

/** Semicircles with and without posts. */
export const shortStackCases: Case[] = ['semicircle-20', 'semicircle-50'].flatMap((name) => {
  const { title, shape } = cases.find((c) => c.name === name)!;
  const posts = postsRound(shape.rotor.radius);
  return [
    { name, title: `${title}, three rotor plates`, shape },
    {
      name: `${name}-posts`,
      title: `${title}, three rotor plates, three posts`,
      shape: { ...shape, posts },
    },
  ];
});
