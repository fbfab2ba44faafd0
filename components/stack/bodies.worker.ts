import type { Derived } from '@/geometry';
import { bodiesOf, type Body } from './bodies';

export type BodiesAnswer = { readonly bodies: Body[] } | { readonly failure: string };

function answer(derived: Derived): BodiesAnswer {
  try {
    return { bodies: bodiesOf(derived) };
  } catch (error) {
    return { failure: error instanceof Error ? error.message : String(error) };
  }
}

addEventListener('message', ({ data }: MessageEvent<Derived>) => postMessage(answer(data)));
