import {
  createEdgeCache,
  derive,
  type Derivation,
  type Design,
  type FieldModel,
} from '@/geometry';

export interface Question {
  readonly design: Design;
  readonly model: FieldModel;
}

/** What comes back for a question, in the order of the questions. */
export type Answer = { readonly derivation: Derivation } | { readonly failure: string };

/** Edges solved so far: most keystrokes leave gap and sheet as they are. */
const cache = createEdgeCache();

function answer({ design, model }: Question): Answer {
  try {
    return { derivation: derive(design, { model, cache }) };
  } catch (error) {
    return { failure: error instanceof Error ? error.message : String(error) };
  }
}

addEventListener('message', ({ data }: MessageEvent<Question>) => postMessage(answer(data)));
