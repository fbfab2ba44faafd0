/** One's own account: new passwords, ended sessions, mail choices, several workshops. */

import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, test } from 'vitest';
import { PUT as NAME } from '@/app/api/account/name/route';
import { PUT as PASSWORD } from '@/app/api/account/password/route';
import { DELETE as END_SESSIONS } from '@/app/api/account/sessions/route';
import { POST as CHOOSE } from '@/app/api/account/workshop/route';
import { PUT as CHOOSE_MAIL } from '@/app/api/account/workshops/[id]/mail/route';
import { POST as OPEN } from '@/app/api/account/workshops/route';
import { POST as FORGOT } from '@/app/api/forgot/route';
import { GET as DESIGNS, POST as MAKE } from '@/app/api/designs/route';
import { GET as PEOPLE } from '@/app/api/people/route';
import { POST as RESET } from '@/app/api/reset/route';
import { Design, Mail, mailChoices, Membership, PasswordReset, User } from '@/entities';
import { hashPassword } from '@/lib/password';
import { mailChoiceSchema } from '@/lib/schemas/account';
import { signIn } from '@/lib/sign-in';
import { entityManager } from '../support/as-owner';
import { call, refusal } from '../support/call';
import { Cast, cookieFor } from '../support/cast';
import { askWith } from '../support/request-context';

let cast: Cast;
let id: string;
let email: string;
const password = 'the first password';

beforeEach(async () => {
  cast = await Cast.gather();
  id = await cast.member('builder');
  email = `${id}@test.example`;
  const em = await entityManager();
  await em.nativeUpdate(User, id, { passwordHash: await hashPassword(password) });
  askWith({ cookie: await cookieFor(id) });
});

const designs = async () => (await call(DESIGNS, {})).status;
const signsIn = (words: string) => signIn({ email, password: words }, {});

describe('a forgotten password', () => {
  const forgot = (address: string) =>
    call(FORGOT, {}, { method: 'POST', body: { email: address } });
  const reset = (secret: string, words: string) =>
    call(RESET, {}, { method: 'POST', body: { secret, password: words } });
  async function secret(): Promise<string> {
    const em = await entityManager();
    const [mail] = await em.find(
      Mail,
      { toAddress: email, kind: 'reset' },
      { orderBy: { createdAt: 'desc' } },
    );
    return /\/reset\/([\w-]+)/.exec(mail!.text)![1]!;
  }

  test('is made anew once by the link, which ends every session', async () => {
    expect((await forgot(email)).status).toBe(204);
    const link = await secret();
    expect(await designs()).toBe(200);
    expect((await reset(link, 'short')).status).toBe(422);
    const done = await reset(link, 'the second password');
    expect(await done.json()).toEqual({ email });
    expect(await designs()).toBe(401);
    expect(await signsIn(password)).toBeNull();
    expect(await signsIn('the second password')).toEqual({ id, epoch: 1 });
    const again = await reset(link, 'the third password');
    expect(again.status).toBe(404);
    expect((await refusal(again)).message).toContain('has been used');
  });

  test('an hour later the link has expired; one link used ends the others', async () => {
    await forgot(email);
    const first = await secret();
    const em = await entityManager();
    const row = await em.findOneOrFail(PasswordReset, { user: id });
    const minutes = (row.expiresAt.getTime() - Date.now()) / 60_000;
    expect(minutes).toBeGreaterThan(59);
    expect(minutes).toBeLessThanOrEqual(60);
    await forgot(email);
    expect((await reset(await secret(), 'the second password')).status).toBe(200);
    expect((await refusal(await reset(first, 'the third password'))).message).toContain('used');
    await em.nativeUpdate(
      PasswordReset,
      { user: id },
      { expiresAt: new Date(Date.now() - 1000), usedAt: null },
    );
    const late = await reset(first, 'the third password');
    expect((await refusal(late)).message).toContain('expired');
  });

  test('two who use the link at once: one wins', async () => {
    await forgot(email);
    const link = await secret();
    const answers = await Promise.all([
      reset(link, 'password of one'),
      reset(link, 'password of two'),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404].sort());
    const em = await entityManager();
    expect((await em.findOneOrFail(User, id)).sessionEpoch).toBe(1);
  });

  test('nobody can tell who has an account; a hammering one is stopped', async () => {
    const nobody = `${randomUUID()}@test.example`;
    for (const address of [email, nobody]) {
      const answer = await forgot(address);
      expect([answer.status, await answer.text()]).toEqual([204, '']);
    }
    const em = await entityManager();
    expect(await em.count(Mail, { toAddress: nobody })).toBe(0);
    const statuses = [];
    for (let i = 0; i < 9; i++) statuses.push((await forgot(nobody)).status);
    expect(statuses.at(-1)).toBe(429);
  });
});

describe('signing out everywhere', () => {
  test('ends the sessions there are, and none that begins afterwards', async () => {
    expect(await designs()).toBe(200);
    expect((await call(END_SESSIONS, {}, { method: 'DELETE' })).status).toBe(204);
    expect(await designs()).toBe(401);
    expect((await call(NAME, {}, { method: 'PUT', body: { name: 'Still me' } })).status).toBe(
      401,
    );
    askWith({ cookie: await cookieFor(id, undefined, 1) });
    expect(await designs()).toBe(200);
    cast.ask('builder');
    expect(await designs()).toBe(200);
  });
});

describe('a new password', () => {
  const change = (current: string, words = 'the second password') =>
    call(PASSWORD, {}, { method: 'PUT', body: { current, password: words } });

  test('asks for the old one, and ends other sessions', async () => {
    const wrong = await change('not this');
    expect(wrong.status).toBe(422);
    expect(await refusal(wrong)).toMatchObject({ field: 'current' });
    expect(await signsIn(password)).toEqual({ id, epoch: 0 });
    expect((await change(password)).status).toBe(200);
    expect(await designs()).toBe(401);
    expect(await signsIn('the second password')).toEqual({ id, epoch: 1 });
  });

  test('a guesser with an open session is stopped', async () => {
    for (let i = 0; i < 10; i++) expect((await change(`guess ${i}`)).status).toBe(422);
    expect((await change(password)).status).toBe(429);
  });
});

describe('mail choices', () => {
  const choose = (workshop: string, muted: string[]) =>
    call(CHOOSE_MAIL, { id: workshop }, { method: 'PUT', body: { muted } });

  test('are kept for each workshop', async () => {
    expect((await choose(cast.workshopId, ['cut', 'cut', 'asked'])).status).toBe(200);
    const em = await entityManager();
    const mine = await em.findOneOrFail(Membership, { user: id });
    expect(mine.mutedMail).toEqual(['cut', 'asked']);
    expect((await choose(cast.workshopId, ['everything'])).status).toBe(422);
    expect((await choose(randomUUID(), [])).status).toBe(404);
  });

  test('are the same ones on the screen as in the tables', () => {
    expect(mailChoiceSchema.options).toEqual(mailChoices);
  });
});

describe('several workshops', () => {
  const choose = (workshop: string) =>
    call(
      CHOOSE,
      {},
      {
        method: 'POST',
        raw: new URLSearchParams({ workshop }).toString(),
        headers: { 'content-type': 'application/x-www-form-urlencoded' },
      },
    );
  const withCookie = async (workshop: string) =>
    askWith({ cookie: `${await cookieFor(id)}; vaneloft-workshop=${workshop}` });
  const members = async () =>
    ((await (await call(PEOPLE, {})).json()) as { members: unknown[] }).members.length;

  test('one is set up beside the first, changed to, and each shows its own', async () => {
    const made = await call(OPEN, {}, { method: 'POST', body: { workshop: 'Evening Bench' } });
    expect(made.status).toBe(201);
    const own = ((await made.json()) as { id: string }).id;
    expect(made.headers.get('set-cookie')).toContain(own);
    expect(await members()).toBe(4);
    const changed = await choose(own);
    expect(changed.status).toBe(303);
    expect(changed.headers.get('location')).toBe('/designs');
    expect(changed.headers.get('set-cookie')).toContain(`vaneloft-workshop=${own}`);
    await withCookie(own);
    expect(await members()).toBe(1);
    const design = await call(MAKE, {}, { method: 'POST', body: { name: 'Evening' } });
    const em = await entityManager();
    const stored = await em.findOneOrFail(Design, ((await design.json()) as { id: string }).id);
    expect(stored.workshop.id).toBe(own);
  });

  test("another's workshop can be neither changed to nor named in a hand-made cookie", async () => {
    const other = await Cast.gather();
    expect((await choose(other.workshopId)).status).toBe(404);
    const secret = await other.design();
    await withCookie(other.workshopId);
    const list = await (await call(DESIGNS, {})).text();
    expect(list).not.toContain(secret);
    expect(await members()).toBe(4);
  });

  test('a cookie of a workshop that one was removed from leads to the next', async () => {
    const made = await call(OPEN, {}, { method: 'POST', body: { workshop: 'Evening Bench' } });
    const own = ((await made.json()) as { id: string }).id;
    await withCookie(cast.workshopId);
    expect(await members()).toBe(4);
    const em = await entityManager();
    await em.nativeUpdate(
      Membership,
      { user: id, workshop: cast.workshopId },
      { removedAt: new Date() },
    );
    expect(await members()).toBe(1);
    await em.nativeUpdate(Membership, { user: id, workshop: own }, { removedAt: new Date() });
    expect(await designs()).toBe(401);
    // The account itself goes on.
    expect((await call(NAME, {}, { method: 'PUT', body: { name: 'Alone' } })).status).toBe(200);
  });
});
