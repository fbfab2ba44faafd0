import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { Revision } from './revision';
import { Workshop } from './workshop';

/** The bytes of one file of a revision. Fixed for good once the revision is released. */
export const RevisionFile = defineEntity({
  name: 'RevisionFile',
  tableName: 'revision_files',
  uniques: [{ properties: ['revision', 'name'] }],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    revision: () => p.manyToOne(Revision),
    /** Its place in the list of files. */
    position: p.integer(),
    name: p.string().length(200),
    label: p.string().length(200),
    kind: p.string().length(10),
    mediaType: p.string().length(100),
    bytes: p.integer(),
    sha256: p.string().length(64),
    body: p.blob().lazy(),
  },
});
export type RevisionFile = InferEntity<typeof RevisionFile>;
