/** All parts of a capacitor with their places, and what doesn't fit. */

import type { Derived } from '../derived';
import { emptyCollection, type Placed } from './collection';
import { addFrame, frameLayout } from './frame';
import type { Part } from './part';
import { addPlates } from './plates';
import { addRods } from './rods';
import { addScreens } from './screens';
import { addRotorSpacers, addStatorSpacers } from './spacers';

export interface Assembly {
  readonly parts: readonly Part[];
  readonly placed: readonly Placed[];
}

/** Everything that is cut, turned or bought for a design, in the order of assembly. */
export function assemblyOf(derived: Derived): Assembly {
  const collection = emptyCollection();
  const layout = frameLayout(derived);
  addPlates(collection, derived);
  addRotorSpacers(collection, derived, layout && { from: layout.back, to: layout.front });
  addStatorSpacers(
    collection,
    derived,
    layout && {
      from: layout.back + derived.design.bushFlange,
      to: layout.front - derived.design.bushFlange,
    },
  );
  addScreens(collection, derived, layout);
  if (layout) addFrame(collection, derived, layout);
  addRods(collection, derived, layout);
  return collection;
}

export function partsOf(derived: Derived): readonly Part[] {
  return assemblyOf(derived).parts;
}
