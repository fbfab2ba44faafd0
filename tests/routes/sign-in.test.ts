import { beforeAll, expect, test } from 'vitest';
import { Membership } from '@/entities';
import { authOptions } from '@/lib/auth';
import { entityManager } from '../support/as-owner';
import { signUp } from '@/lib/sign-up';

const email = 'anna@bench.example';
const password = 'a long enough one';
let userId: string;

beforeAll(async () => {
  const form = { workshop: 'Bench', name: 'Anna', email, password };
  ({ userId } = await signUp(form, '192.0.2.200'));
});

type Authorize = (
  credentials: Record<string, string>,
  request: { headers: Record<string, string> },
) => Promise<{ id: string } | null>;

/** Signs in through next-auth's own options, from one address. */
function attempt(address: string, credentials: Record<string, string>) {
  const provider = authOptions().providers[0]!.options as { authorize: Authorize };
  return provider.authorize(credentials, { headers: { 'x-forwarded-for': address } });
}

test('the right password signs in, whatever the case of the email', async () => {
  expect(await attempt('192.0.2.1', { email, password })).toEqual({ id: userId, epoch: 0 });
  expect(await attempt('192.0.2.1', { email: ' ANNA@Bench.example', password })).not.toBeNull();
});

test.each([
  [{ email, password: 'wrong' }],
  [{ email: 'nobody@bench.example', password }],
  [{ email: 'no address', password }],
  [{ email }],
  [{}],
])('%j does not', async (credentials: Record<string, string>) => {
  expect(await attempt('192.0.2.2', credentials)).toBeNull();
});

test('after eight wrong ones from an address even the right one waits; elsewhere it does not', async () => {
  for (let i = 0; i < 8; i++) {
    expect(await attempt('192.0.2.3', { email, password: `wrong ${i}` })).toBeNull();
  }
  await expect(attempt('192.0.2.3', { email, password })).rejects.toThrow(/^too-many$/);
  expect(await attempt('192.0.2.4', { email, password })).toEqual({ id: userId, epoch: 0 });
});

test('wrong ones side by side are all counted', async () => {
  const tries = Array.from({ length: 20 }, (_, i) =>
    attempt('192.0.2.5', { email: 'side@bench.example', password: `wrong ${i}` }).then(
      () => 'refused',
      (error: Error) => error.message,
    ),
  );
  const answers = await Promise.all(tries);
  expect(answers.filter((answer) => answer === 'refused')).toHaveLength(8);
  expect(answers.filter((answer) => answer === 'too-many')).toHaveLength(12);
});

test('an address that tries many emails is stopped', async () => {
  const answers: string[] = [];
  for (let i = 0; i < 62; i++) {
    const tried = attempt('192.0.2.6', { email: `p${i}@bench.example`, password: 'wrong' });
    answers.push(
      await tried.then(
        () => 'refused',
        (error: Error) => error.message,
      ),
    );
  }
  expect(answers.slice(0, 60)).not.toContain('too-many');
  expect(answers.slice(60)).toEqual(['too-many', 'too-many']);
});

test('only the nearest proxy is believed about the address', async () => {
  const wrong = { email: 'spoof@bench.example', password: 'wrong' };
  for (let i = 0; i < 8; i++) await attempt(`198.51.100.${i}, 192.0.2.7`, wrong);
  await expect(attempt('198.51.100.99, 192.0.2.7', wrong)).rejects.toThrow('too-many');
});

test('signing in does not need a membership, but opens nothing without one', async () => {
  const em = await entityManager();
  await em.nativeDelete(Membership, { user: userId });
  expect(await attempt('192.0.2.8', { email, password })).toEqual({ id: userId, epoch: 0 });
});
