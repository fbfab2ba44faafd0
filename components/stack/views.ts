/** Directions from which the stack is looked at: from the stack to the eye, not yet of length 1. */
export const views = {
  front: { label: 'Front', direction: [0, 0, 1] },
  side: { label: 'Side', direction: [1, 0, 0] },
  threeQuarter: { label: 'Three-quarter', direction: [0.85, 0.55, 1.15] },
} as const;

export type ViewName = keyof typeof views;
