import { expect, test } from 'vitest';
import { signUpAction } from '@/app/(account)/sign-up/actions';
import { Membership, User, Workshop } from '@/entities';
import { entityManager } from '../support/as-owner';
import { askWith } from '../support/request-context';

const good = {
  workshop: 'Corner Bench',
  name: 'Tess',
  email: 'Tess@Corner.example',
  password: 'twelve or more',
};

function submit(values: Record<string, string>, address = '203.0.113.1') {
  askWith({ 'x-forwarded-for': address });
  const form = new FormData();
  for (const [name, value] of Object.entries(values)) form.set(name, value);
  return signUpAction({}, form);
}

async function counts() {
  const em = await entityManager();
  return [await em.count(User), await em.count(Workshop), await em.count(Membership)];
}

test('makes the workshop with its owner, and a row in the record', async () => {
  expect(await submit(good)).toEqual({ ok: true });
  const em = await entityManager();
  const membership = await em.findOneOrFail(
    Membership,
    { user: { email: 'tess@corner.example' } },
    { populate: ['user', 'workshop'] },
  );
  expect(membership.role).toBe('owner');
  expect(membership.workshop.name).toBe('Corner Bench');
  expect(membership.user.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  const rows = await em.execute('select what, subject from record_entries');
  expect(rows).toEqual([{ what: 'workshop-opened', subject: membership.workshop.id }]);
});

test('an email that is taken makes nothing, and is named', async () => {
  const before = await counts();
  const answer = await submit({ ...good, email: 'TESS@corner.example ' });
  expect(answer).toMatchObject({ field: 'email', error: expect.stringContaining('already') });
  expect(await counts()).toEqual(before);
});

test.each([
  [{ workshop: '' }, 'workshop'],
  [{ name: 'x'.repeat(81) }, 'name'],
  [{ name: 'a\0b' }, 'name'],
  [{ email: 'tess' }, 'email'],
  [{ password: 'Zq7!' }, 'password'],
  [{ password: 'x'.repeat(201) }, 'password'],
])('%j is refused and named; the password is not sent back', async (change, field) => {
  const values = { ...good, ...change };
  const answer = await submit(values, '203.0.113.2');
  expect(answer.field).toBe(field);
  expect(answer.error).toMatch(/^(Workshop|Name|Email|Password): /);
  const { password, ...shown } = values;
  expect(answer.values).toEqual(shown);
  expect(JSON.stringify(answer)).not.toContain(password);
});

test('an address that opens many is stopped', async () => {
  const open = (i: number) => submit({ ...good, email: `t${i}@corner.example` }, '203.0.113.3');
  for (let i = 0; i < 10; i++) expect((await open(i)).ok).toBe(true);
  const answer = await open(10);
  expect(answer.error).toMatch(/^Too many attempts; wait \d+ minutes/);
});
