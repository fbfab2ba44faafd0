/** Cut orders, as their routes take and answer them. */

import { z } from 'zod';
import { designFileSchema, filePartSchema } from './file-part';
import { shopItemSchema } from './shop-item';

const orderStates = ['queued', 'cutting', 'returned', 'cut', 'cancelled'] as const;
export const orderStateSchema = z.enum(orderStates);
export type OrderState = z.infer<typeof orderStateSchema>;

const named = z.object({ id: z.uuid(), name: z.string() });

const orderedRevisionSchema = z.object({
  id: z.uuid(),
  designId: z.uuid(),
  designName: z.string(),
  number: z.number().int(),
  name: z.string(),
  state: z.enum(['draft', 'in-review', 'released', 'superseded', 'withdrawn']),
});
export type OrderedRevision = z.infer<typeof orderedRevisionSchema>;

export const orderSummarySchema = z.object({
  id: z.uuid(),
  number: z.number().int(),
  version: z.number().int(),
  state: orderStateSchema,
  revision: orderedRevisionSchema,
  /** Capacitors, each with all of the parts that the order covers. */
  quantity: z.number().int(),
  /** Of the store: asked for, and once it is cut, used. */
  sheets: z.number().int(),
  sheet: named,
  machine: named,
  dueOn: z.iso.date(),
  orderedBy: named,
  takenBy: named.nullable(),
  /** What the machine opens, one file a part; none where the revision must not be cut. */
  files: z.array(designFileSchema),
  updatedAt: z.iso.datetime(),
});
export type OrderSummary = z.infer<typeof orderSummarySchema>;

export const orderListSchema = z.object({ orders: z.array(orderSummarySchema) });

const orderItemSchema = shopItemSchema.extend({
  /** Taken out of the workshop's list since. */
  gone: z.boolean(),
});

const attachedSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  mediaType: z.string(),
  bytes: z.number().int(),
  /** A picture that a browser may show. */
  shown: z.boolean(),
});
export type Attached = z.infer<typeof attachedSchema>;

const messageKinds = ['remark', 'question', 'answer'] as const;

const orderMessageSchema = z.object({
  id: z.uuid(),
  kind: z.enum(messageKinds),
  text: z.string(),
  at: z.iso.datetime(),
  author: named,
  attachments: z.array(attachedSchema),
});
export type OrderMessage = z.infer<typeof orderMessageSchema>;

const orderPartSchema = filePartSchema.extend({ files: z.array(designFileSchema) });
export type OrderPart = z.infer<typeof orderPartSchema>;

export const orderSchema = orderSummarySchema.extend({
  sheet: orderItemSchema,
  machine: orderItemSchema,
  note: z.string(),
  orderedAt: z.iso.datetime(),
  /** Those parts of the revision that are cut from this sheet. */
  parts: z.array(orderPartSchema),
  /** Drawing, lists and the like. */
  otherFiles: z.array(designFileSchema),
  /** Parts of the revision that want another sheet, hence another order. */
  otherParts: z.array(z.object({ label: z.string(), sheet: z.string() })),
  /** What the machine makes of the parts, where it does not simply hold. */
  cautions: z.array(z.string()),
  /** Why it must not be cut, or null. */
  hindrance: z.string().nullable(),
  /** The revision to cut instead, where there is another. */
  successor: z.object({ id: z.uuid(), number: z.number().int() }).nullable(),
  scrap: z.number().int().nullable(),
  /** As measured, mm. */
  actualKerf: z.number().nullable(),
  cutAt: z.iso.datetime().nullable(),
  messages: z.array(orderMessageSchema),
  /** What the person who asked may do; the server decides again at every write. */
  may: z.object({ order: z.boolean(), cut: z.boolean(), edit: z.boolean() }),
});
export type Order = z.infer<typeof orderSchema>;

/** Released revisions, each with the sheets that its parts want. */
export const orderableSchema = z.object({
  revisions: z.array(
    orderedRevisionSchema.extend({
      wants: z.array(
        z.object({
          material: z.string(),
          thickness: z.number(),
          sheet: z.string(),
          parts: z.array(z.string()),
        }),
      ),
    }),
  ),
});
export type Orderable = z.infer<typeof orderableSchema>['revisions'][number];

const whole = (label: string, min: number, max: number) => {
  const error = `${label}: not a whole number from ${min} to ${max}; give one`;
  return z.number({ error }).int(error).min(min, error).max(max, error);
};

const version = z
  .number({ error: 'Version: missing; give the one that you opened.' })
  .int('Version: not a whole number; give the one that you opened.')
  .positive('Version: not above zero; give the one that you opened.');

const asked = {
  sheet: z.uuid('Sheet: none chosen; choose one of the store'),
  machine: z.uuid('Machine: none chosen; choose one of the workshop'),
  quantity: whole('Quantity', 1, 10_000),
  sheets: whole('Sheets', 0, 10_000),
  dueOn: z.iso.date('Due date: not a day; give one as 2026-03-31'),
  note: z
    .string()
    .trim()
    .max(500, 'Note: longer than 500 characters; shorten it, or write under the order')
    .default(''),
};

export const placeOrderSchema = z.object({
  revision: z.uuid('Revision: none chosen; choose a released one'),
  ...asked,
});
export type PlaceOrder = z.input<typeof placeOrderSchema>;

export const changeOrderSchema = z.object({ version, ...asked });
export type ChangeOrder = z.input<typeof changeOrderSchema>;

/** For what needs nothing but the order: to begin and to cancel it. */
export const moveOrderSchema = z.object({ version });

export const finishOrderSchema = z.object({
  version,
  /** Really taken from the store. */
  sheets: whole('Sheets used', 0, 10_000),
  /** Pieces spoilt. */
  scrap: whole('Scrap', 0, 100_000),
  /** mm; null where it was not measured. */
  actualKerf: z
    .number({ error: 'Kerf: not a number; give it in mm, or nothing' })
    .nullable()
    .default(null),
});
export type FinishOrder = z.input<typeof finishOrderSchema>;

/** The fields of a form with a message; files come beside them. */
export const writeMessageSchema = z.object({
  kind: z.enum(messageKinds, 'Kind: not one of remark, question, answer'),
  text: z
    .string({ error: 'Text: missing; write something' })
    .trim()
    .max(2000, 'Text: longer than 2000 characters; shorten it'),
  /** As a form has it; not needed for a remark. */
  version: z
    .string()
    .regex(/^\d{1,9}$/, 'Version: not a number; give the one that you opened.')
    .transform(Number)
    .optional(),
});

/** Bytes of one file, files of one message, bytes of all files of one order. */
export const ATTACHMENT_LIMITS = { bytes: 5_000_000, files: 4, order: 25_000_000 } as const;
