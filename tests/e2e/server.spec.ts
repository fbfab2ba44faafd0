/** The served build by plain requests: sign-in, session cookie, roles, headers. */

import { expect, test } from '@playwright/test';
import { RELEASED } from '../support/design-screen';
import {
  builder,
  machinist,
  outsider,
  signInByRequest,
  type SignIn,
} from '../support/sign-ins';

async function designsOf(
  request: Parameters<typeof signInByRequest>[0],
): Promise<{ id: string; name: string; version: number }[]> {
  const response = await request.get('/api/designs');
  return (
    (await response.json()) as { designs: { id: string; name: string; version: number }[] }
  ).designs;
}

test('health asks the database', async ({ request }) => {
  const response = await request.get('/api/health');
  expect(response.status()).toBe(200);
  expect(await response.json()).toEqual({ status: 'ok' });
});

test('signing in, being known, signing out', async ({ request }) => {
  expect((await request.get('/api/designs')).status()).toBe(401);
  const signedIn = await signInByRequest(request, builder);
  expect(signedIn.status()).toBe(200);
  const cookie = signedIn
    .headersArray()
    .find(
      ({ name, value }) => name.toLowerCase() === 'set-cookie' && /session-token/.test(value),
    );
  expect(cookie!.value).toMatch(/HttpOnly/i);
  expect(cookie!.value).toMatch(/SameSite=Lax/i);
  expect((await designsOf(request)).length).toBeGreaterThan(0);

  const { csrfToken } = (await (await request.get('/api/auth/csrf')).json()) as {
    csrfToken: string;
  };
  await request.post('/api/auth/signout', { form: { csrfToken, json: 'true' } });
  expect((await request.get('/api/designs')).status()).toBe(401);
});

test('a wrong password is refused without saying which part was wrong', async ({ request }) => {
  const answers: string[] = [];
  for (const person of [
    { email: machinist.email, password: 'not this one' },
    { email: 'nobody@larkfield.example', password: 'not this one' },
  ]) {
    const response = await signInByRequest(request, person);
    expect(response.status()).toBe(401);
    answers.push(new URL(((await response.json()) as { url: string }).url).search);
  }
  expect(answers).toEqual(['?error=CredentialsSignin&provider=credentials', answers[0]]);
  expect((await request.get('/api/designs')).status()).toBe(401);
});

test('too many wrong passwords are stopped, for this address and email', async ({
  request,
}) => {
  const someone = { email: 'guessed@larkfield.example', password: 'wrong' };
  for (let i = 0; i < 8; i++)
    expect((await signInByRequest(request, someone)).status()).toBe(401);
  const response = await signInByRequest(request, someone);
  expect(((await response.json()) as { url: string }).url).toContain('error=too-many');
  expect((await signInByRequest(request, builder)).status()).toBe(200);
});

test('a machinist downloads and changes nothing; another workshop finds nothing', async ({
  playwright,
  baseURL,
}) => {
  const as = async (person: SignIn) => {
    const context = await playwright.request.newContext({ baseURL });
    expect((await signInByRequest(context, person)).ok()).toBe(true);
    return context;
  };
  const [writer, reader, stranger] = [
    await as(builder),
    await as(machinist),
    await as(outsider),
  ];
  const design = (await designsOf(reader)).find(({ name }) => name === RELEASED)!;
  const path = `/api/designs/${design.id}`;
  const { revisions } = (await (await writer.get(`${path}/history`)).json()) as {
    revisions: { id: string; state: string }[];
  };
  const released = revisions.find(({ state }) => state === 'released')!;
  const frozen = `/api/revisions/${released.id}`;
  const { files } = (await (await reader.get(`${frozen}/files`)).json()) as {
    files: { name: string; kind: string }[];
  };
  for (const kind of ['dxf', 'svg']) {
    const { name } = files.find((file) => file.kind === kind)!;
    const file = `${frozen}/files/${encodeURIComponent(name)}`;
    expect((await reader.get(file)).status()).toBe(200);
    expect((await stranger.get(file)).status()).toBe(404);
  }
  // What is saved is not for those who cut, nor are its saves.
  for (const draft of [path, `${path}/files`, `${path}/history`]) {
    expect((await reader.get(draft)).status(), draft).toBe(404);
  }
  const stored = (await (await writer.get(path)).json()) as Record<string, unknown>;
  const data = { version: stored.version, name: 'Changed by hand', design: stored.design };
  for (const [context, status] of [
    [reader, 403],
    [stranger, 404],
  ] as const) {
    expect((await context.put(path, { data })).status()).toBe(status);
    expect((await context.delete(path)).status()).toBe(status);
    const move = { to: 'withdrawn', from: 'released', reason: 'by hand' };
    expect((await context.put(`${frozen}/state`, { data: move })).status()).toBe(status);
  }
  expect(await (await writer.get(path)).json()).toEqual(stored);
  await Promise.all([writer.dispose(), reader.dispose(), stranger.dispose()]);
});

test('every page has its own nonce and the headers that keep others out', async ({
  request,
}) => {
  const nonces = new Set<string>();
  for (let i = 0; i < 2; i++) {
    const response = await request.get('/sign-in');
    const headers = response.headers();
    const policy = headers['content-security-policy']!;
    expect(policy).not.toContain('unsafe-eval');
    expect(policy).toContain("frame-ancestors 'none'");
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['x-powered-by']).toBeUndefined();
    const nonce = /'nonce-([^']+)'/.exec(policy)![1]!;
    nonces.add(nonce);
    const scripts = (await response.text()).match(/<script\b[^>]*>/g)!;
    expect(scripts.filter((script) => !script.includes(`nonce="${nonce}"`))).toEqual([]);
  }
  expect(nonces.size).toBe(2);
});
