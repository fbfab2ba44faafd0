/** Shaft and posts, bought as rod. */

import type { Derived } from '../derived';
import { addBought, type Collection } from './collection';
import { nutHeight, postPlaces, shaftBack, type FrameLayout } from './frame';
import { threadThrough } from './thread';

/** mm. Without a frame shaft and posts stand out this far at either end. */
const OUT = 10;

const written = (length: number): string => String(Number(length.toFixed(1)));

export function addRods(
  collection: Collection,
  derived: Derived,
  layout: FrameLayout | null,
): void {
  const { design, stack } = derived;
  const shaft = layout
    ? {
        from: shaftBack(layout),
        to: layout.front + layout.thickness + design.shaftFront,
      }
    : { from: -OUT, to: stack.depth + OUT };
  addBought(
    collection,
    {
      key: 'shaft',
      label: 'Shaft',
      section: null,
      size: `Ø ${design.shaftDiameter} h6 × ${written(shaft.to - shaft.from)}`,
      note: 'Silver steel or ground stainless rod; holes in rotor plates drawn at its nominal size',
    },
    [{ x: 0, y: 0, ...shaft, angle: 0, turns: true }],
  );
  const thread = threadThrough(design.postHoleDiameter);
  const beyond = layout
    ? layout.thickness + design.bushFlange + nutHeight(design.postHoleDiameter)
    : OUT;
  const post = layout
    ? { from: layout.back - beyond, to: layout.front + beyond }
    : { from: -beyond, to: stack.depth + beyond };
  const sets = new Set(stack.plates.map(({ section, pack }) => `${section} ${pack}`)).size;
  const posts = postPlaces(derived);
  addBought(
    collection,
    {
      key: 'post',
      label: sets > 1 ? 'Insulating post' : 'Post',
      section: null,
      size: `${thread === null ? `Ø ${design.postHoleDiameter}` : `M${thread}`} × ${written(post.to - post.from)}`,
      note:
        sets > 1
          ? 'Glass-filled epoxy or ceramic rod: it carries stators with terminals of their own'
          : 'Threaded rod',
    },
    posts.map(({ x, y }) => ({ x, y, ...post, angle: 0, turns: false })),
  );
  addBought(
    collection,
    {
      key: 'post-nut',
      label: 'Nut for a post',
      section: null,
      size: thread === null ? `for Ø ${design.postHoleDiameter}` : `M${thread}`,
      note: 'With washer',
    },
    2 * posts.length,
  );
}
