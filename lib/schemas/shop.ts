import { z } from 'zod';
import { KernelError } from '@/geometry';
import { checkMachine, checkSheet } from '@/geometry/cutting/shop-parameters';
import { shopItemSchema } from './shop-item';

export { shopItemSchema, type ShopItem } from './shop-item';

/** As routes call them. */
export const shopKindSchema = z.enum(['machines', 'sheets']);
export type ShopKind = z.infer<typeof shopKindSchema>;

const itemNameSchema = z
  .string()
  .trim()
  .min(1, 'Name: empty; give 1 to 80 characters')
  .max(80, 'Name: too long; give at most 80 characters');

const valuesOf = (check: (input: Record<string, unknown>) => unknown) =>
  z.record(z.string(), z.unknown()).transform((input, context) => {
    try {
      return check(input) as Record<string, string | number>;
    } catch (error) {
      if (!(error instanceof KernelError)) throw error;
      context.addIssue({ code: 'custom', message: error.message, path: [error.path] });
      return z.NEVER;
    }
  });

/** What is sent to make or change an item; `version` only to change one. */
export const saveItemSchemas = {
  machines: z.object({
    name: itemNameSchema,
    version: z.number().int().positive().optional(),
    values: valuesOf(checkMachine),
  }),
  sheets: z.object({
    name: itemNameSchema,
    version: z.number().int().positive().optional(),
    values: valuesOf(checkSheet),
  }),
} as const;

export const shopItemsSchema = z.object({ items: z.array(shopItemSchema) });
