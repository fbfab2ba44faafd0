/** Files that are cut from, and the parts they hold, as routes answer them. */

import { z } from 'zod';

export const designFileSchema = z.object({
  name: z.string(),
  /** What it holds, for a person: `Rotor plate, section 1`. */
  label: z.string(),
  kind: z.enum(['dxf', 'svg', 'csv', 'json', 'pdf', 'zip']),
  bytes: z.number().int(),
  sha256: z.string(),
});
/** A part that is cut, as its own files have it. mm */
export const filePartSchema = z.object({
  /** Of the names of its files. */
  stem: z.string(),
  label: z.string(),
  material: z.string(),
  thickness: z.number(),
  quantity: z.number().int(),
  /** Nominal: no kerf is allowed for. */
  kerf: z.enum(['nominal', 'compensated']),
  note: z.string(),
  caution: z.string(),
  /** Path data of outside and holes, y downwards, and the box it fills. */
  picture: z.object({
    x: z.number(),
    y: z.number(),
    width: z.number(),
    height: z.number(),
    path: z.string(),
  }),
});
export type FilePart = z.infer<typeof filePartSchema>;

export const designFilesSchema = z.object({
  version: z.number().int(),
  files: z.array(designFileSchema),
  parts: z.array(filePartSchema),
});
export type DesignFiles = z.infer<typeof designFilesSchema>;
