import { z } from 'zod';

const instant = (label: string) =>
  z.iso.datetime({ error: `${label}: not a moment; give one like 2026-03-01T00:00:00Z` });

/** Which rows of the record are asked for. */
export const recordQuerySchema = z.object({
  /** Whose deeds. */
  who: z.uuid('Person: no such one in this workshop').optional(),
  /** What was done, as the record names it. */
  what: z
    .string()
    .max(40)
    .regex(/^[a-z-]+$/, 'Done: not a word of the record')
    .optional(),
  /** What it was done to. */
  subject: z.uuid('Subject: no such one in this workshop').optional(),
  from: instant('From').optional(),
  /** Up to but without this moment. */
  until: instant('Until').optional(),
  /** Only rows older than this one, for the next page. */
  before: z
    .string()
    .regex(/^\d{1,18}$/, 'Before: not the number of a row')
    .optional(),
});
export type RecordQuery = z.infer<typeof recordQuerySchema>;

export const recordRowSchema = z.object({
  id: z.string(),
  at: z.iso.datetime(),
  who: z.object({ id: z.uuid(), name: z.string() }),
  what: z.string(),
  /** The same in words: `saved`. */
  did: z.string(),
  subject: z.object({ id: z.uuid(), name: z.string() }),
  /** Number of the revision that it was done to or with. */
  revision: z.number().int().nullable(),
  /** What else is kept of it, in pairs of name and value. */
  facts: z.array(z.tuple([z.string(), z.string()])),
});
export type RecordRow = z.infer<typeof recordRowSchema>;

export const recordPageSchema = z.object({
  rows: z.array(recordRowSchema),
  /** Are there older ones? */
  more: z.boolean(),
});
export type RecordPage = z.infer<typeof recordPageSchema>;
