/** Mail: written with what it tells of, queued by the database, sent once. */

import { randomUUID } from 'node:crypto';
import { createTransport } from 'nodemailer';
import { Pool } from 'pg';
import pino from 'pino';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { Mail, Membership, User } from '@/entities';
import { inWorkshop } from '@/lib/db';
import { addMail } from '@/lib/mail/add-mail';
import { writeLetter } from '@/lib/mail/letter';
import { mailSender } from '@/lib/mail/mail-sender';
import { tellMembers } from '@/lib/mail/tell-members';
import { entityManager } from '../support/as-owner';
import { Cast } from '../support/cast';
import { openInbox, type Inbox } from '../support/smtp-inbox';

let cast: Cast;
let inbox: Inbox;
let pool: Pool;

beforeAll(async () => {
  cast = await Cast.gather();
  inbox = await openInbox();
  pool = new Pool({ connectionString: process.env.OWNER_DATABASE_URL!, max: 8 });
});

afterAll(async () => {
  await pool.end();
  await inbox.close();
});

beforeEach(() => {
  inbox.messages.length = 0;
  inbox.refuse = 0;
  inbox.delay = 0;
});

const letter = {
  subject: 'Released: <Bench & Co>',
  lines: ['Ivo released revision 2 of <b>Bench & Co</b>.'],
  link: { path: '/designs/1', label: 'Open "it"' },
};

const owner = () => ({
  workshopId: cast.workshopId,
  userId: cast.person('owner').id,
  name: 'Test owner',
  email: 'owner@test.example',
  role: 'owner' as const,
  workshopName: 'Harrow Lane',
});

async function write(event: string, { secret = false, fail = false } = {}): Promise<void> {
  await inWorkshop(owner(), async (tx) => {
    addMail(tx, {
      workshopId: cast.workshopId,
      kind: 'released',
      event,
      to: 'reader@test.example',
      letter,
      secret,
    });
    await tx.flush();
    if (fail) throw new Error('the event did not happen');
  });
}

const stored = async (event: string) =>
  (await entityManager()).findOneOrFail(Mail, { event }, { refresh: true });
const jobs = async (id: string) =>
  (await entityManager()).execute<{ key: string; task_identifier: string }[]>(
    'select key, task_identifier from graphile_worker.jobs where key = ?',
    [`mail:${id}`],
  );

function sender(url = inbox.url) {
  const transport = createTransport({ url, connectionTimeout: 2_000 }, { from: 'x@y.example' });
  return mailSender(
    pool,
    (message) => transport.sendMail(message),
    'y.example',
    pino({ level: 'silent' }),
  );
}

describe('writing', () => {
  test('a mail is in the queue under a key of its own, with the commit and not before', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    const { id, attempts, sentAt } = await stored(event);
    expect({ attempts, sentAt }).toEqual({ attempts: 0, sentAt: null });
    expect(await jobs(id)).toEqual([{ key: `mail:${id}`, task_identifier: 'send-mail' }]);
  });

  test('what is rolled back leaves neither mail nor job', async () => {
    const em = await entityManager();
    const count = async () => [
      await em.count(Mail),
      ...(await em.execute<unknown[]>('select count(*) from graphile_worker.jobs')),
    ];
    const before = await count();
    await expect(write(`test:${randomUUID()}`, { fail: true })).rejects.toThrow('not happen');
    expect(await count()).toEqual(before);
  });

  test('one event is never two mails to one address', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    await expect(write(event)).rejects.toThrow(/mails_event_to_address_unique/);
  });

  test('text and HTML say the same, the HTML without markup from names; the link is absolute', () => {
    const { subject, text, html } = writeLetter(letter);
    expect(subject).toBe('Released: <Bench & Co>');
    expect(text).toContain('revision 2 of <b>Bench & Co</b>.');
    expect(text).toContain('Open "it":\nhttp://127.0.0.1:3000/designs/1');
    expect(html).toContain('revision 2 of &lt;b&gt;Bench &amp; Co&lt;/b&gt;.');
    expect(html).toContain('href="http://127.0.0.1:3000/designs/1"');
    expect(html).toContain('Open &quot;it&quot;');
    expect(html).not.toContain('<b>');
    const broken = writeLetter({ ...letter, subject: 'a\r\nBcc: everybody@test.example' });
    expect(broken.subject).toBe('a Bcc: everybody@test.example');
  });

  test('members are told who want to be, and not whoever did it, nor the removed', async () => {
    const em = await entityManager();
    const [wants, mutes, gone] = await Promise.all(
      [1, 2, 3].map(() => cast.member('machinist')),
    );
    await em.nativeUpdate(Membership, { user: mutes! }, { mutedMail: ['cut', 'released'] });
    await em.nativeUpdate(Membership, { user: gone! }, { removedAt: new Date() });
    const event = `test:${randomUUID()}`;
    await inWorkshop(owner(), (tx) =>
      tellMembers(tx, owner(), {
        choice: 'released',
        event,
        to: ({ userId, role }) => role === 'machinist' || userId === owner().userId,
        ...letter,
      }),
    );
    const told = (await em.find(Mail, { event })).map(({ toAddress }) => toAddress);
    const { email } = await em.findOneOrFail(User, cast.person('machinist').id);
    expect(told.sort()).toEqual([email, `${wants}@test.example`].sort());
  });
});

describe('sending', () => {
  test('a mail goes out once, under a Message-ID of its own, and is noted', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    const { id } = await stored(event);
    const send = sender();
    await send(id);
    await send(id);
    expect(inbox.messages).toHaveLength(1);
    const [message] = inbox.messages;
    expect(message!.messageId).toBe(`<${id}@y.example>`);
    expect(message!.subject).toBe(letter.subject);
    expect(message!.text).toContain('Ivo released');
    expect(message!.html).toContain('Ivo released');
    const mail = await stored(event);
    expect(mail).toMatchObject({ attempts: 1, lastError: null });
    expect(mail.sentAt).toBeInstanceOf(Date);
    expect(mail.text).toContain('Ivo released');
  });

  test('words that open something are not kept once they are sent', async () => {
    const event = `test:${randomUUID()}`;
    await write(event, { secret: true });
    expect((await stored(event)).html).toContain('href=');
    await sender()((await stored(event)).id);
    expect(await stored(event)).toMatchObject({ text: '', html: '' });
    expect(inbox.messages[0]!.text).toContain('/designs/1');
  });

  test('a refusal is noted and thrown, so that the queue tries again; then it goes out', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    const { id } = await stored(event);
    const send = sender();
    inbox.refuse = 2;
    for (const attempts of [1, 2]) {
      await expect(send(id)).rejects.toThrow(/not now/);
      expect(await stored(event)).toMatchObject({
        attempts,
        sentAt: null,
        lastError: expect.stringContaining('not now'),
      });
    }
    await send(id);
    expect(inbox.messages).toHaveLength(1);
    expect(await stored(event)).toMatchObject({ attempts: 3, lastError: null });
  });

  test('a mail server that is not there is noted the same', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    const { id } = await stored(event);
    await expect(sender('smtp://127.0.0.1:1')(id)).rejects.toThrow(/ECONNREFUSED/);
    expect(await stored(event)).toMatchObject({ attempts: 1, sentAt: null });
  });

  test('two senders at once, of one process or of two, send it once', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    const { id } = await stored(event);
    inbox.delay = 300;
    const one = sender();
    const other = sender();
    const ends = await Promise.allSettled([one(id), one(id), other(id)]);
    expect(ends.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    await Promise.all([one(id), other(id)]);
    expect(inbox.messages).toHaveLength(1);
    expect((await stored(event)).attempts).toBe(1);
  });

  test('taken by the server while the database dies: noted at the retry, not sent again', async () => {
    const event = `test:${randomUUID()}`;
    await write(event);
    const { id } = await stored(event);
    const fragile = new Pool({
      connectionString: process.env.OWNER_DATABASE_URL!,
      application_name: 'fragile',
    });
    fragile.on('error', () => {});
    fragile.on('connect', (client) => client.on('error', () => {}));
    const transport = createTransport({ url: inbox.url }, { from: 'x@y.example' });
    const send = mailSender(
      fragile,
      (message) => transport.sendMail(message),
      'y.example',
      pino({ level: 'silent' }),
    );
    inbox.delay = 300;
    const first = send(id);
    await new Promise((resolve) => setTimeout(resolve, 150));
    await pool.query(
      `select pg_terminate_backend(pid) from pg_stat_activity where application_name = 'fragile'`,
    );
    await expect(first).rejects.toThrow();
    expect((await stored(event)).sentAt).toBeNull();
    await send(id);
    await fragile.end();
    expect(inbox.messages).toHaveLength(1);
    expect((await stored(event)).sentAt).toBeInstanceOf(Date);
  });
});
