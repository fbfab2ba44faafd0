import { createHash } from 'node:crypto';
import type { CutFile } from '@/geometry/files';

/** A file as it is downloaded. */
export interface HashedFile {
  readonly name: string;
  /** What it holds, for a person. */
  readonly label: string;
  readonly kind: CutFile['kind'] | 'pdf' | 'zip';
  readonly mediaType: string;
  readonly body: Uint8Array;
  readonly sha256: string;
}

export const hashOf = (body: Uint8Array): string =>
  createHash('sha256').update(body).digest('hex');

/** The same with its hash. */
export const hashed = (file: Omit<HashedFile, 'sha256'>): HashedFile => ({
  ...file,
  sha256: hashOf(file.body),
});
