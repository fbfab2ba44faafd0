import { z } from 'zod';
import { sheetParameters } from '@/geometry/cutting/shop-parameters';
import { saveItemSchemas } from './shop';

/** mm. Bed and sheet are never larger: geometry/cutting/shop-parameters.ts. */
const FARTHEST = sheetParameters.width.max;
const length = z.number().min(0).max(FARTHEST);
const place = z.number().min(-FARTHEST).max(FARTHEST);

const placementSchema = z.object({
  key: z.string().max(80),
  /** Counted from 0 within its group. */
  sheet: z.number().int().min(0),
  x: place,
  y: place,
  /** rad */
  angle: z.number().min(-100).max(100),
});

const groupSchema = z.object({
  material: z.enum(sheetParameters.material.options.map(({ value }) => value)),
  thickness: length,
  sheets: z.array(z.object({ width: length, height: length })).min(1),
  placements: z.array(placementSchema).min(1),
});

/** A layout whose files are wanted: made from the saved version by the machine named. mm, rad */
export const writeSheetsSchema = z.object({
  /** Of the design. */
  version: z.number().int().positive(),
  machine: z.discriminatedUnion('from', [
    z.object({
      from: z.literal('workshop'),
      id: z.string(),
      version: z.number().int().positive(),
    }),
    saveItemSchemas.machines.omit({ version: true }).extend({ from: z.literal('values') }),
  ]),
  /** How many capacitors. */
  copies: z.number().int().min(1).max(100),
  settings: z.object({
    gap: z.number().min(0).max(50),
    margin: z.number().min(0).max(100),
    rotations: z.union([1, 2, 4, 8, 12].map((count) => z.literal(count))),
  }),
  kerf: z.enum(['nominal', 'compensated']),
  groups: z.array(groupSchema).min(1).max(40),
  /** One sheet's DXF alone instead of all files in a ZIP; both counted from 0. */
  only: z.object({ group: z.number().int().min(0), sheet: z.number().int().min(0) }).optional(),
});
export type WriteSheets = z.input<typeof writeSheetsSchema>;
