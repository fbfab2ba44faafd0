import { z } from 'zod';

/** A machine or sheet as it is stored. Apart from shop.ts, which holds the kernel's checks. */
export const shopItemSchema = z.object({
  id: z.string(),
  name: z.string(),
  version: z.number().int(),
  values: z.record(z.string(), z.union([z.string(), z.number()])),
  updatedAt: z.string(),
  updatedBy: z.object({ id: z.string(), name: z.string() }),
});
export type ShopItem = z.infer<typeof shopItemSchema>;
