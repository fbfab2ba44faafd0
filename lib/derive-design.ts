import { createEdgeCache, derive, type Derivation, type Design } from '@/geometry';

/** Edges solved in this process; they depend on ratios alone and belong to nobody. */
const cache = createEdgeCache();

/** Derives with the whole field model, as files and checks are always made. */
export function deriveDesign(design: Design): Derivation {
  return derive(design, { model: 'field', cache });
}
