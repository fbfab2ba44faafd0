import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Client as Database } from 'pg';
import type { Client } from './client';

/** The owner invites somebody every now and then, so that mail is written and sent meanwhile. */
export async function inviteUntil(over: () => boolean, client: Client): Promise<void> {
  for (let i = 1; !over(); i++) {
    await client.insist('invite', '/api/invitations', 'POST', {
      email: `guest-${i}@load.example`,
      role: 'machinist',
    });
    await wait(1_500);
  }
}

/** How often the mail server was handed each message, by the id of the mail. */
function received(folder: string): Map<string, number> {
  const counts = new Map<string, number>();
  for (const name of readdirSync(folder).filter((file) => file.endsWith('.json'))) {
    const { messageId } = JSON.parse(readFileSync(join(folder, name), 'utf8')) as {
      messageId: string;
    };
    const id = /^<([^@]+)@/.exec(messageId)?.[1] ?? messageId;
    counts.set(id, (counts.get(id) ?? 0) + 1);
  }
  return counts;
}

/** Waits until the queue is empty, then says what was lost or came twice. */
export async function checkMails(
  ownerUrl: string,
  folder: string,
): Promise<{ written: number; faults: string[] }> {
  const database = new Database({ connectionString: ownerUrl });
  await database.connect();
  const end = Date.now() + 60_000;
  let rows: { id: string; sent: boolean }[];
  do {
    await wait(500);
    ({ rows } = await database.query<{ id: string; sent: boolean }>(
      'select id, sent_at is not null as sent from mails',
    ));
  } while (rows.some(({ sent }) => !sent) && Date.now() < end);
  await database.end();
  const counts = received(folder);
  const faults = rows.flatMap(({ id, sent }) => {
    const times = counts.get(id) ?? 0;
    return sent && times === 1
      ? []
      : [`mail ${id}: ${sent ? 'sent' : 'waits'}, came ${times}×`];
  });
  return { written: rows.length, faults };
}
