import { beforeAll, expect, test } from 'vitest';
import { GET, POST } from '@/app/api/designs/route';
import { Membership } from '@/entities';
import { entityManager } from '../support/as-owner';
import { call } from '../support/call';
import { Cast, cookieFor } from '../support/cast';
import { askWith } from '../support/request-context';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

const status = async () => (await call(GET, {})).status;

test('a cookie sealed with another secret is nobody', async () => {
  askWith({
    cookie: await cookieFor(cast.person('owner').id, 'another secret of some length'),
  });
  expect(await status()).toBe(401);
});

test.each(['', 'x', 'a.b.c.d.e', 'x'.repeat(10_000)])(
  'a made-up cookie is nobody',
  async (value) => {
    askWith({ cookie: `next-auth.session-token=${value}` });
    expect(await status()).toBe(401);
  },
);

test('a cookie that names no id is nobody', async () => {
  askWith({ cookie: await cookieFor("' or true --") });
  expect(await status()).toBe(401);
});

test('a token in an Authorization header is not taken', async () => {
  const token = cast.person('owner').cookie.split('=')[1]!;
  askWith({ authorization: `Bearer ${token}` });
  expect(await status()).toBe(401);
});

test('a session follows the membership: a role taken away is gone at the next request', async () => {
  cast.ask('builder');
  const make = () => call(POST, {}, { method: 'POST', body: { name: 'Once more' } });
  expect((await make()).status).toBe(201);
  const em = await entityManager();
  const mine = { user: cast.person('builder').id };
  await em.nativeUpdate(Membership, mine, { role: 'machinist' });
  expect((await make()).status).toBe(403);
  await em.nativeDelete(Membership, mine);
  expect((await make()).status).toBe(401);
  expect(await status()).toBe(401);
});
