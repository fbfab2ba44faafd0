import type { Derivation } from './derived';
import type { Design } from './design';

export function derive(design: Design): Derivation {
  throw new Error(`not written yet: ${design.sections.length}`);
}
