import { createEdgeCache, derive, type Derivation, type Design } from '@/geometry';

/** Edges solved in this process; they depend on ratios alone and belong to nobody. */
const cache = createEdgeCache();

/** What was derived last, by the design's values: saving, page and list of files ask in turn. */
const lately = new Map<string, Derivation>();
const KEPT = 16;

/** Derives with the whole field model, as files and checks are always made. */
export function deriveDesign(design: Design): Derivation {
  const key = JSON.stringify(design);
  const known = lately.get(key);
  const derivation = known ?? derive(design, { model: 'field', cache });
  // The longest unasked goes first.
  lately.delete(key);
  lately.set(key, derivation);
  if (lately.size > KEPT) lately.delete(lately.keys().next().value!);
  return derivation;
}
