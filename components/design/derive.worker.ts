import { expose } from 'comlink';
import { createEdgeCache, derive, type Design, type FieldModel } from '@/geometry';

/** Edges solved so far: most keystrokes leave gap and sheet as they are. */
const cache = createEdgeCache();

const kernel = {
  derive: (design: Design, model: FieldModel) => derive(design, { model, cache }),
};

export type KernelWorker = typeof kernel;

expose(kernel);
