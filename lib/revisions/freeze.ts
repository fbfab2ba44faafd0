import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import {
  PARAMETERS_FORMAT,
  Revision,
  RevisionFile,
  User,
  type Design,
  type Waiver,
} from '@/entities';
import type { Derivation } from '@/geometry';
import { assessmentOf } from '../kernel/assessment';
import type { FileNames } from '../kernel/file-names';
import type { HashedFile } from '../kernel/hashed-file';

interface Named {
  readonly number: number;
  readonly name: string;
  readonly note: string;
  readonly by: string;
  readonly at: Date;
}

/** What the files of a saved design say of it. */
export const NOT_RELEASED = 'Draft, not released';

/** A waiver as the files have it. */
export const waiverWords = ({ label, reason, by }: Waiver): string =>
  `${label}. ${by}: ${reason}`;

/** What a revision's files are called, and what stands in their title blocks. */
export function revisionNames(
  design: { readonly id: string; readonly name: string },
  owner: string,
  revision: { readonly number: number; readonly creator: string; readonly issued: Date },
  released: { readonly by: string; readonly waivers: readonly string[] } | null = null,
): FileNames {
  return {
    name: design.name,
    number: design.id.slice(0, 8).toUpperCase(),
    owner,
    revision: String(revision.number),
    issued: revision.issued.toISOString(),
    creator: revision.creator,
    approved: released?.by ?? '',
    status: released ? 'Released' : 'Not released',
    waivers: released?.waivers ?? [],
  };
}

/** Puts files under a revision, in their order. */
export function addFiles(
  tx: EntityManager,
  revision: Revision,
  files: readonly HashedFile[],
  at: Date,
): void {
  files.forEach(({ name, label, kind, mediaType, body, sha256 }, position) => {
    tx.create(RevisionFile, {
      workshop: revision.workshop,
      revision,
      position,
      name,
      label,
      kind,
      mediaType,
      bytes: body.byteLength,
      sha256,
      body: Buffer.from(body),
      createdAt: at,
    });
  });
}

/** Freezes a design as it is saved, with all that the kernel says of it and every file. */
export function freeze(
  tx: EntityManager,
  design: Design,
  derivation: Derivation,
  files: readonly HashedFile[],
  { number, name, note, by, at }: Named,
): Revision {
  const revision = tx.create(Revision, {
    id: randomUUID(),
    workshop: design.workshop,
    design,
    number,
    name,
    note,
    designName: design.name,
    version: design.version,
    parameters: design.parameters,
    parametersFormat: PARAMETERS_FORMAT,
    ...assessmentOf(derivation),
    derivation,
    state: 'draft',
    waivers: [],
    createdBy: tx.getReference(User, by),
    createdAt: at,
    updatedAt: at,
  });
  addFiles(tx, revision, files, at);
  return revision;
}
