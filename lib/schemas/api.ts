/** What the routes under app/api take and answer, one schema each, used at both ends. */

import { z } from 'zod';
import { designSchema } from './design';
import { orderSchema } from './order';
import { revisionSchema } from './revision';
import { shopItemSchema } from './shop-item';

export const roles = ['owner', 'builder', 'machinist'] as const;
export const roleSchema = z.enum(roles);
export type Role = z.infer<typeof roleSchema>;

/** Where a design stands by its revisions; `changed` is saved since the one that is released. */
export const designStates = ['draft', 'in-review', 'released', 'changed', 'withdrawn'] as const;
export const designStateSchema = z.object({
  kind: z.enum(designStates),
  /** Number of the revision that says so. */
  revision: z.number().int().nullable(),
});
export type DesignState = z.infer<typeof designStateSchema>;

export const designNameSchema = z
  .string()
  .trim()
  .min(1, 'Name: empty; give the design a name')
  .max(80, 'Name: longer than 80 characters; shorten it');

const checksSchema = z.object({ ok: z.number(), warn: z.number(), fail: z.number() });
const personSchema = z.object({ id: z.uuid(), name: z.string() });

export const designSummarySchema = z.object({
  id: z.uuid(),
  name: z.string(),
  state: designStateSchema,
  version: z.number().int(),
  /** Laws of the sections in order, as `frequency`. */
  laws: z.array(z.string()),
  /** Findings counted when it was last saved. */
  checks: checksSchema,
  updatedAt: z.iso.datetime(),
  updatedBy: personSchema,
});
export type DesignSummary = z.infer<typeof designSummarySchema>;

export const designListSchema = z.object({ designs: z.array(designSummarySchema) });

export const designRecordSchema = designSummarySchema.extend({
  design: designSchema,
  /** Version of the kernel that checked it at the last save. */
  kernel: z.string(),
  createdAt: z.iso.datetime(),
  /** May the person who asked change it? The server decides again at every write. */
  mayEdit: z.boolean(),
});
export type DesignRecord = z.infer<typeof designRecordSchema>;

export const createDesignSchema = z.object({
  name: designNameSchema,
  /** Without one: the kernel's default design. */
  design: designSchema.optional(),
});
export type CreateDesign = z.input<typeof createDesignSchema>;

export const saveDesignSchema = z.object({
  /** The version this work began from; an older one than stored answers 409 with the stored. */
  version: z.number().int().positive(),
  name: designNameSchema,
  design: designSchema,
});
export type SaveDesign = z.input<typeof saveDesignSchema>;

export type { FilePart, DesignFiles } from './file-part';
export { designFilesSchema } from './file-part';

export const errorCodes = [
  'bad-input',
  'not-signed-in',
  'not-allowed',
  'not-found',
  'conflict',
  'checks-fail',
  'withdrawn',
  'too-many',
  'unavailable',
  'internal',
] as const;

/** Every answer that is not a success, for every route. */
export const apiErrorSchema = z.object({
  error: z.object({
    code: z.enum(errorCodes),
    /** Plain words for the person: field, value and what would work. */
    message: z.string(),
    /** Where in the input, as `design.sections.0.airGap`. */
    field: z.string().optional(),
  }),
  /** With `conflict`: what is stored now. */
  current: z
    .union([designRecordSchema, shopItemSchema, orderSchema, revisionSchema])
    .optional(),
});
export type ApiErrorCode = (typeof errorCodes)[number];
export type Current = NonNullable<z.infer<typeof apiErrorSchema>['current']>;
