import type { KerfState } from '../cutting/cut-path';
import type { Machine } from '../cutting/machine';

/** What notes and screens say of the kerf. */
export const kerfWords = (state: KerfState, { kerf }: Pick<Machine, 'kerf'>): string =>
  state === 'nominal'
    ? 'nominal size, no kerf allowed for'
    : `contours moved by half of ${kerf} mm of kerf, outer out, holes in`;
