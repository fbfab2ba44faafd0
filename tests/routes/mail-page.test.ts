/** What an owner reads of sent mail, where it goes to the stand-in that npm start brings along. */

import { spawn, type ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { Pool } from 'pg';
import pino from 'pino';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';
import { GET as MAILS } from '@/app/api/mails/route';
import { POST as FORGOT } from '@/app/api/forgot/route';
import { POST as INVITE } from '@/app/api/invitations/route';
import { Mail, Membership, User, Workshop } from '@/entities';
import { mailSender } from '@/lib/mail/mail-sender';
import type { SentMail, SentMails } from '@/lib/schemas/mail';
import { freePort } from '../../scripts/port.mjs';
import { entityManager } from '../support/as-owner';
import { call } from '../support/call';
import { Cast } from '../support/cast';

const folder = mkdtempSync('/var/tmp/vaneloft-mail-');
// Before anybody has asked for the environment.
process.env.MAIL_FOLDER = folder;

const root = join(import.meta.dirname, '..', '..');
let ours: Cast;
let theirs: Cast;
let standIn: ChildProcess;
let pool: Pool;

beforeAll(async () => {
  ours = await Cast.gather();
  theirs = await Cast.gather();
  const port = await freePort();
  standIn = spawn(process.execPath, ['scripts/smtp-fake.mjs', String(port), folder], {
    cwd: root,
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  pool = new Pool({ connectionString: process.env.OWNER_DATABASE_URL! });
  const transport = createTransport(`smtp://127.0.0.1:${port}`, { from: 'x@y.example' });
  await vi.waitFor(() => transport.verify(), { timeout: 10_000 });

  ours.ask('owner');
  const em = await entityManager();
  const member = await em.findOneOrFail(User, ours.person('builder').id);
  const stranger = await em.findOneOrFail(User, theirs.person('machinist').id);
  // A member of ours also belongs to the other workshop's people.
  em.create(Membership, {
    user: member,
    workshop: em.getReference(Workshop, theirs.workshopId),
    role: 'builder',
  });
  await em.flush();
  const invite = (email: string) =>
    call(INVITE, {}, { method: 'POST', body: { email, role: 'builder' } });
  await invite(`ours-${randomUUID()}@test.example`);
  theirs.ask('owner');
  await invite(`theirs-${randomUUID()}@test.example`);
  for (const { email } of [member, stranger]) {
    await call(FORGOT, {}, { method: 'POST', body: { email } });
  }
  // What the other workshop writes to the person who belongs to both.
  em.create(Mail, {
    workshop: em.getReference(Workshop, theirs.workshopId),
    kind: 'released',
    event: `test:${randomUUID()}`,
    toAddress: member.email,
    subject: 'Theirs alone',
    text: 'Theirs alone',
    html: '<head></head>Theirs alone',
  });
  await em.flush();

  const send = mailSender(
    pool,
    (message) => transport.sendMail(message),
    'y.example',
    pino({ level: 'silent' }),
  );
  for (const { id } of await em.find(Mail, {})) await send(id);
});

afterAll(async () => {
  await pool.end();
  standIn.kill();
  rmSync(folder, { recursive: true, force: true });
});

async function mailsOf(cast: Cast): Promise<SentMail[]> {
  cast.ask('owner');
  const { mails, standIn: goesNowhere } = (await (await call(MAILS, {})).json()) as SentMails;
  expect(goesNowhere).toBe(true);
  return mails;
}

test('the stand-in keeps each message, whole', () => {
  expect(readdirSync(folder)).toHaveLength(5);
  expect(readdirSync(folder).every((name) => /^\d+-[0-9a-f-]+\.json$/.test(name))).toBe(true);
});

test("an owner reads their workshop's mail and their members' new passwords, and no other", async () => {
  const mails = await mailsOf(ours);
  expect(mails.map(({ kind }) => kind).sort()).toEqual(['invitation', 'reset']);
  expect(mails.every(({ sentAt }) => sentAt !== null)).toBe(true);
  for (const { words, kind } of mails) {
    const path = kind === 'reset' ? 'reset' : 'join';
    expect(words!.text).toMatch(new RegExp(`http://127\\.0\\.0\\.1:3000/${path}/[\\w-]{43}`));
    expect(words!.html).toContain('<a href="http://127.0.0.1:3000/');
  }
  expect(JSON.stringify(mails)).not.toContain('theirs');
  expect((await mailsOf(theirs)).map(({ subject }) => subject)).toContain('Theirs alone');
});
