import 'server-only';
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { z } from 'zod';
import { env } from '../env';
import { idSchema } from '../schemas/id';

const messageSchema = z.object({
  to: z.array(z.string()),
  text: z.string(),
  html: z.string(),
  messageId: z.string(),
});
type Message = z.infer<typeof messageSchema>;

async function readMessage(file: string): Promise<Message | null> {
  try {
    return messageSchema.parse(JSON.parse(await readFile(file, 'utf8')));
  } catch {
    // The stand-in has thrown it away meanwhile, or it is none of its files.
    return null;
  }
}

/**
 * What the stand-in for a mail server has received, by the id of the mail in our table, which its
 * Message-ID is made of. Null where mail goes to a server in earnest.
 */
export async function receivedMail(): Promise<Map<string, Message> | null> {
  const folder = env().MAIL_FOLDER;
  if (folder === undefined) return null;
  const names = await readdir(folder).catch(() => []);
  const found = new Map<string, Message>();
  for (const name of names.filter((one) => one.endsWith('.json'))) {
    const message = await readMessage(join(folder, name));
    const id = idSchema.safeParse(message?.messageId.replace(/^<|@.*$/g, ''));
    if (message && id.success) found.set(id.data, message);
  }
  return found;
}
