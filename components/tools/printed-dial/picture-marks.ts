import {
  rowsOfPicture,
  type FrequencyMark,
  type PicturePoint,
} from '@/geometry/tracking/dial-picture';
import { KernelError, type LawPoint } from '@/geometry';

/** What has been picked on the picture so far. */
export interface PictureMarks {
  readonly centre: PicturePoint | null;
  /** Places of the two reference marks; their angles are typed beside it, rad. */
  readonly references: readonly [PicturePoint | null, PicturePoint | null];
  readonly angles: readonly [number, number];
  readonly frequencies: readonly FrequencyMark[];
}

export type Rows =
  | { readonly ok: true; readonly rows: readonly LawPoint[] }
  | { readonly ok: false; readonly message: string };

/** Any function that makes rows or says why it can't. */
export function rowsOr(make: () => readonly LawPoint[]): Rows {
  try {
    return { ok: true, rows: make() };
  } catch (error) {
    if (!(error instanceof KernelError)) throw error;
    return { ok: false, message: error.message };
  }
}

/** The table that the marks make, or what is still to be picked. */
export function rowsOfMarks({ centre, references, angles, frequencies }: PictureMarks): Rows {
  const [first, second] = references;
  if (!centre) return { ok: false, message: 'Press on the centre of the dial.' };
  if (!first || !second) {
    return { ok: false, message: 'Press on two marks whose angle on the shaft you know.' };
  }
  return rowsOr(() =>
    rowsOfPicture(
      {
        centre,
        references: [
          { ...first, angle: angles[0] },
          { ...second, angle: angles[1] },
        ],
      },
      frequencies,
    ),
  );
}
