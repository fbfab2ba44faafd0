import { z } from 'zod';
import { designFilesSchema } from './file-part';

export const revisionStates = [
  'draft',
  'in-review',
  'released',
  'superseded',
  'withdrawn',
] as const;
export const revisionStateSchema = z.enum(revisionStates);
export type RevisionState = z.infer<typeof revisionStateSchema>;

const personSchema = z.object({ id: z.uuid(), name: z.string() });
const checksSchema = z.object({ ok: z.number(), warn: z.number(), fail: z.number() });
const moment = z.iso.datetime();

const waiverSchema = z.object({
  code: z.string(),
  section: z.number().int().nullable(),
  label: z.string(),
  reason: z.string(),
  by: z.string(),
});

/** A named, frozen copy of a design. */
export const revisionSchema = z.object({
  id: z.uuid(),
  designId: z.uuid(),
  designName: z.string(),
  number: z.number().int(),
  name: z.string(),
  note: z.string(),
  state: revisionStateSchema,
  /** Version of the design that it froze. */
  version: z.number().int(),
  /** Version of the kernel that derived it. */
  kernel: z.string(),
  checks: checksSchema,
  waivers: z.array(waiverSchema),
  createdAt: moment,
  createdBy: personSchema,
  releasedAt: moment.nullable(),
  releasedBy: personSchema.nullable(),
  withdrawnAt: moment.nullable(),
  withdrawnBy: personSchema.nullable(),
  withdrawnReason: z.string().nullable(),
  updatedAt: moment,
});
export type Revision = z.infer<typeof revisionSchema>;

/** One save of a design. */
export const designVersionSchema = z.object({
  version: z.number().int(),
  name: z.string(),
  kernel: z.string(),
  checks: checksSchema,
  savedAt: moment,
  savedBy: personSchema,
});
export type DesignVersion = z.infer<typeof designVersionSchema>;

/** What became of a design: its revisions and every save, newest first. */
export const historySchema = z.object({
  revisions: z.array(revisionSchema),
  versions: z.array(designVersionSchema),
});
export type History = z.infer<typeof historySchema>;

export const nameRevisionSchema = z.object({
  /** The saved version that is meant; an older one than stored answers 409. */
  version: z.number().int().positive(),
  name: z
    .string()
    .trim()
    .min(1, 'Name: empty; say what this revision is for')
    .max(80, 'Name: longer than 80 characters; shorten it'),
  note: z.string().trim().max(500, 'Note: longer than 500 characters; shorten it').default(''),
});
export type NameRevision = z.input<typeof nameRevisionSchema>;

const reasonSchema = z
  .string()
  .trim()
  .min(3, 'Reason: too short; say why in a few words')
  .max(500, 'Reason: longer than 500 characters; shorten it');

/** Where a revision goes next. `from` is where the screen saw it; elsewhere answers 409. */
export const moveRevisionSchema = z.discriminatedUnion('to', [
  z.object({ to: z.literal('in-review'), from: revisionStateSchema }),
  z.object({ to: z.literal('draft'), from: revisionStateSchema, reason: reasonSchema }),
  z.object({
    to: z.literal('released'),
    from: revisionStateSchema,
    /** The owner's word for each check that fails. */
    waivers: z
      .array(
        z.object({
          code: z.string().max(60),
          section: z.number().int().nullable(),
          /** Tells apart checks of one code. */
          label: z.string().max(200),
          reason: reasonSchema,
        }),
      )
      .max(50)
      .default([]),
  }),
  z.object({ to: z.literal('withdrawn'), from: revisionStateSchema, reason: reasonSchema }),
]);
export type MoveRevision = z.input<typeof moveRevisionSchema>;

/** From where a design goes on: one of its saves or revisions. */
export const restoreSchema = z.object({
  /** The version that stands now. */
  version: z.number().int().positive(),
  from: z.union([
    z.object({ version: z.number().int().positive() }),
    z.object({ revision: z.uuid() }),
  ]),
});
export type Restore = z.input<typeof restoreSchema>;

/** A revision's files, as they are kept. */
export const revisionFilesSchema = designFilesSchema;
