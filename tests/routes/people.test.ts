/** Who belongs to a workshop: asked in, let in, given a role, removed. */

import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { POST as JOIN } from '@/app/api/join/route';
import { DELETE as WITHDRAW } from '@/app/api/invitations/[id]/route';
import { POST as INVITE } from '@/app/api/invitations/route';
import { GET as MAILS } from '@/app/api/mails/route';
import { DELETE as REMOVE, PUT as SET_ROLE } from '@/app/api/people/[id]/route';
import { GET as PEOPLE } from '@/app/api/people/route';
import { Invitation, Mail, Membership, User } from '@/entities';
import { openInvitation } from '@/lib/people/invitation-link';
import { signIn } from '@/lib/sign-in';
import type { SentMails } from '@/lib/schemas/mail';
import type { People } from '@/lib/schemas/people';
import { entityManager } from '../support/as-owner';
import { call, refusal } from '../support/call';
import { Cast, cookieFor } from '../support/cast';
import { askWith } from '../support/request-context';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

beforeEach(() => cast.ask('owner'));

const invite = (email: string, role = 'builder') =>
  call(INVITE, {}, { method: 'POST', body: { email, role } });
const join = (body: Record<string, string>) => call(JOIN, {}, { method: 'POST', body });
const setRole = (id: string, role: string) =>
  call(SET_ROLE, { id }, { method: 'PUT', body: { role } });
const remove = (id: string) => call(REMOVE, { id }, { method: 'DELETE' });
const people = async () => (await (await call(PEOPLE, {})).json()) as People;

/** The secret that the mail to this address holds; there must be one mail that is not sent yet. */
async function secretFor(email: string): Promise<string> {
  const em = await entityManager();
  const [mail] = await em.find(Mail, { toAddress: email }, { orderBy: { createdAt: 'desc' } });
  return /\/join\/([\w-]+)/.exec(mail!.text)![1]!;
}

async function membership(email: string): Promise<Membership> {
  const em = await entityManager();
  return em.findOneOrFail(Membership, { user: { email }, workshop: cast.workshopId });
}

describe('an invitation', () => {
  test('comes by mail, opens once for a new person, and its secret is not in the tables', async () => {
    const email = `${randomUUID()}@test.example`;
    const made = await invite(` ${email.toUpperCase()} `);
    expect(made.status).toBe(201);
    const { id } = (await made.json()) as { id: string };
    expect((await people()).invitations).toContainEqual(
      expect.objectContaining({ id, email, role: 'builder', invitedBy: 'Test owner' }),
    );
    const secret = await secretFor(email);
    const em = await entityManager();
    const row = await em.findOneOrFail(Invitation, id);
    expect(row.tokenHash).toHaveLength(43);
    expect(JSON.stringify(row)).not.toContain(secret);
    const days = (row.expiresAt.getTime() - Date.now()) / 86_400_000;
    expect(days).toBeGreaterThan(6.99);
    expect(days).toBeLessThanOrEqual(7);
    expect(await em.findOneOrFail(Mail, { toAddress: email })).toMatchObject({
      secret: true,
      kind: 'invitation',
      event: `invitation:${id}`,
    });

    cast.ask('signedOut');
    const password = 'twelve or more';
    const joined = await join({ secret, name: 'Asked In', password });
    expect(joined.status).toBe(200);
    expect(await joined.json()).toEqual({ email });
    const cookie = joined.headers.get('set-cookie')!;
    expect(cookie).toContain(`vaneloft-workshop=${cast.workshopId}`);
    expect(cookie).toMatch(/HttpOnly; SameSite=Lax/);
    const member = await membership(email);
    expect(member).toMatchObject({ role: 'builder', removedAt: null });
    expect(await signIn({ email, password }, {})).toEqual({ id: member.user.id, epoch: 0 });
    const [entry] = await cast.record(member.user.id);
    expect(entry).toMatchObject({ what: 'member-joined', detail: { again: false } });

    const again = await join({ secret, name: 'Somebody', password });
    expect(again.status).toBe(404);
    expect((await refusal(again)).message).toContain('has been used');
  });

  test('is used by one of two who come at once', async () => {
    const { secret, email } = await cast.invitation();
    cast.ask('signedOut');
    const body = { secret, name: 'One', password: 'twelve or more' };
    const answers = await Promise.all([join(body), join({ ...body, name: 'Two' })]);
    expect(answers.map(({ status }) => status).filter((status) => status === 200)).toHaveLength(
      1,
    );
    const em = await entityManager();
    expect(await em.count(User, { email })).toBe(1);
    expect(await em.count(Membership, { user: { email } })).toBe(1);
  });

  test('is used by one of two sessions of the invited person who come at once', async () => {
    const em = await entityManager();
    const outsider = await em.findOneOrFail(User, cast.person('outsider').id);
    const { secret } = await cast.invitation({ email: outsider.email });
    cast.ask('outsider');
    const answers = await Promise.all([join({ secret }), join({ secret }), join({ secret })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404, 404]);
    await em.nativeDelete(Membership, { user: outsider, workshop: cast.workshopId });
  });

  test('lets in an account of that address alone, when somebody is signed in', async () => {
    const { secret, email } = await cast.invitation();
    cast.ask('builder');
    const answer = await join({ secret, name: 'Me', password: 'twelve or more' });
    expect(answer.status).toBe(403);
    expect((await refusal(answer)).message).toContain(`is for ${email}`);
    expect(await (await entityManager()).count(User, { email })).toBe(0);
  });

  test('does not set the password of an account that exists', async () => {
    const em = await entityManager();
    const { email } = await em.findOneOrFail(User, cast.person('outsider').id);
    const { secret } = await cast.invitation({ email });
    cast.ask('signedOut');
    const answer = await join({ secret, name: 'Thief', password: 'twelve or more' });
    expect(answer.status).toBe(422);
    expect((await refusal(answer)).message).toContain('sign in with it');
    em.clear();
    expect(await em.findOneOrFail(User, { email })).toMatchObject({
      name: 'Test outsider',
      passwordHash: 'none',
    });
    // Refused as a whole: the link still opens for the right person.
    expect(await openInvitation(secret)).toMatchObject({ email });
  });

  test.each([
    ['expired', { expiresAt: new Date(Date.now() - 1000) }, null],
    ['withdrawn', {}, { withdrawnAt: new Date() }],
    ['been used', {}, { usedAt: new Date() }],
  ])('that has %s says so', async (word, given, change) => {
    const { id, secret, email } = await cast.invitation(given);
    const em = await entityManager();
    if (change) await em.nativeUpdate(Invitation, id, change);
    cast.ask('signedOut');
    const answer = await join({ secret, name: 'Late', password: 'twelve or more' });
    expect(answer.status).toBe(404);
    expect((await refusal(answer)).message).toContain(word);
    await expect(openInvitation(secret)).rejects.toThrow(word);
    expect(await em.count(User, { email })).toBe(0);
  });

  test('sent again replaces the one before; withdrawn, it opens nothing', async () => {
    const email = `${randomUUID()}@test.example`;
    await invite(email, 'machinist');
    const first = await secretFor(email);
    const { id } = (await (await invite(email, 'builder')).json()) as { id: string };
    const second = await secretFor(email);
    await expect(openInvitation(first)).rejects.toThrow('withdrawn');
    expect(await openInvitation(second)).toMatchObject({ role: 'builder' });
    const open = (await people()).invitations.filter((one) => one.email === email);
    expect(open.map((one) => one.id)).toEqual([id]);
    expect((await call(WITHDRAW, { id }, { method: 'DELETE' })).status).toBe(204);
    await expect(openInvitation(second)).rejects.toThrow('withdrawn');
    expect((await call(WITHDRAW, { id }, { method: 'DELETE' })).status).toBe(404);
  });

  test.each([
    [{ email: 'nobody', role: 'builder' }, 'email', /^Email: not an address/],
    [{ email: 'a@b.example', role: 'boss' }, 'role', /^Role: not one of/],
    [{ role: 'builder' }, 'email', /email/i],
  ])('%j is refused and named', async (body, field, words) => {
    const answer = await call(INVITE, {}, { method: 'POST', body });
    expect(answer.status).toBe(422);
    expect(await refusal(answer)).toMatchObject({
      field,
      message: expect.stringMatching(words),
    });
  });

  test('to a member is refused', async () => {
    const id = await cast.member('builder');
    const answer = await invite(`${id}@test.example`);
    expect((await refusal(answer)).message).toContain('is a member already');
  });

  test('lets somebody back in who was removed, on the row they had', async () => {
    const id = await cast.member('builder');
    const email = `${id}@test.example`;
    const before = await membership(email);
    expect((await remove(id)).status).toBe(204);
    await invite(email, 'machinist');
    const secret = await secretFor(email);
    askWith({ cookie: await cookieFor(id) });
    expect((await join({ secret })).status).toBe(200);
    const em = await entityManager();
    expect(await em.find(Membership, { user: id })).toEqual([
      expect.objectContaining({ id: before.id, role: 'machinist', removedAt: null }),
    ]);
  });
});

describe('members', () => {
  test('are listed for everybody of the workshop, the invitations for its owners', async () => {
    const { id } = await cast.invitation();
    const listed = await people();
    expect(listed.members.map(({ name }) => name)).toEqual(
      expect.arrayContaining(['Test owner', 'Test builder', 'Test machinist']),
    );
    expect(listed.members.map(({ name }) => name)).not.toContain('Test outsider');
    expect(listed.invitations.map((one) => one.id)).toContain(id);
    cast.ask('machinist');
    expect(await people()).toEqual({ ...listed, invitations: [] });
  });

  test('get another role, which the record names', async () => {
    const id = await cast.member('builder');
    expect((await setRole(id, 'machinist')).status).toBe(204);
    expect((await setRole(id, 'machinist')).status).toBe(204);
    const [entry, ...more] = await cast.record(id);
    expect(entry).toMatchObject({
      what: 'member-role-set',
      detail: { from: 'builder', to: 'machinist' },
    });
    expect(more).toEqual([]);
  });

  test.each([
    ['removed', remove],
    ['no longer an owner', (id: string) => setRole(id, 'builder')],
  ])('whoever is %s leaves no open invitation behind', async (_what, act) => {
    const second = await cast.member('owner');
    askWith({ cookie: await cookieFor(second) });
    const email = `${randomUUID()}@test.example`;
    const { id } = (await (await invite(email, 'owner')).json()) as { id: string };
    const secret = await secretFor(email);
    const { secret: another } = await cast.invitation();
    cast.ask('owner');
    expect((await act(second)).status).toBe(204);
    await expect(openInvitation(secret)).rejects.toThrow('withdrawn');
    expect(await openInvitation(another)).toBeTruthy();
    expect((await cast.record(id)).map(({ what }) => what)).toEqual([
      'member-invited',
      'invitation-withdrawn',
    ]);
  });

  test.each(['x', randomUUID()])('%s is no member', async (id) => {
    expect((await setRole(id, 'builder')).status).toBe(404);
    expect((await remove(id)).status).toBe(404);
  });

  test('the last owner stays', async () => {
    const id = cast.person('owner').id;
    for (const answer of [await setRole(id, 'builder'), await remove(id)]) {
      expect(answer.status).toBe(422);
      expect((await refusal(answer)).message).toContain('is the only owner');
    }
  });

  test.each([
    ['remove each other', remove],
    ['take the role from each other', (id: string) => setRole(id, 'builder')],
  ])('two owners who %s at once: one of them stays', async (_what, act) => {
    const own = await Cast.gather();
    const second = await own.member('owner');
    const asFirst = () => own.ask('owner');
    for (let round = 0; round < 5; round++) {
      const cookie = await cookieFor(second);
      asFirst();
      const one = act(second);
      askWith({ cookie });
      const other = act(own.person('owner').id);
      const statuses = (await Promise.all([one, other])).map(({ status }) => status);
      // The second is no owner any more when their turn comes, nor a member perhaps.
      expect(statuses.filter((status) => status === 204)).toHaveLength(1);
      const em = await entityManager();
      const ours = { workshop: own.workshopId };
      expect(await em.count(Membership, { ...ours, role: 'owner', removedAt: null })).toBe(1);
      await em.nativeUpdate(
        Membership,
        { ...ours, user: [second, own.person('owner').id] },
        { role: 'owner', removedAt: null },
      );
    }
  });
});

describe('the mail page', () => {
  test('shows an owner the mails of their workshop and no other', async () => {
    const email = `${randomUUID()}@test.example`;
    await invite(email);
    const mails = async () =>
      ((await (await call(MAILS, {})).json()) as SentMails).mails.filter(
        ({ to }) => to === email,
      );
    expect(await mails()).toEqual([
      expect.objectContaining({ kind: 'invitation', sentAt: null, attempts: 0, words: null }),
    ]);
    cast.ask('outsider');
    expect(await mails()).toEqual([]);
  });
});
