import { z } from 'zod';

/** A mail of the workshop, as its owners see it. */
export const sentMailSchema = z.object({
  id: z.uuid(),
  kind: z.string(),
  to: z.string(),
  subject: z.string(),
  at: z.iso.datetime(),
  sentAt: z.iso.datetime().nullable(),
  /** Times that sending was tried. */
  attempts: z.number().int(),
  lastError: z.string().nullable(),
  /** As the stand-in for a mail server received it; null when it has not, or there is none. */
  words: z.object({ text: z.string(), html: z.string() }).nullable(),
});
export type SentMail = z.infer<typeof sentMailSchema>;

export const sentMailsSchema = z.object({
  mails: z.array(sentMailSchema),
  /** Mail goes to the stand-in, which delivers none. */
  standIn: z.boolean(),
});
export type SentMails = z.infer<typeof sentMailsSchema>;
