import { createEdgeCache, derive, type Derivation, type Design } from '@/geometry';

/** Edges solved in this thread; they depend on ratios alone and belong to nobody. */
const cache = createEdgeCache();

/** Derives with the whole field model, as files and checks are always made. */
export const deriveDesign = (design: Design): Derivation =>
  derive(design, { model: 'field', cache });
