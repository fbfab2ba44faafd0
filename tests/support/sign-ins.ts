/** The people of the demo workshop, with the passwords that seeding made for this database. */

import { readFileSync } from 'node:fs';
import { expect, type APIRequestContext, type Page } from '@playwright/test';

export interface SignIn {
  readonly workshop: string;
  readonly name: string;
  readonly email: string;
  readonly role: string;
  readonly password: string;
}

const people = JSON.parse(
  readFileSync(process.env.SIGN_INS ?? '.data/sign-ins.json', 'utf8'),
) as SignIn[];
const ours = (role: string) =>
  people.find((person) => person.role === role && person.workshop === people[0]!.workshop)!;

export const owner = ours('owner');
export const builder = ours('builder');
export const machinist = ours('machinist');
/** Owner of the other workshop. */
export const outsider = people.find(({ workshop }) => workshop !== people[0]!.workshop)!;

/** Signs in by next-auth's own requests, without the screen. Resolves to the last answer. */
export async function signInByRequest(
  request: APIRequestContext,
  { email, password }: Pick<SignIn, 'email' | 'password'>,
) {
  const csrf = (await (await request.get('/api/auth/csrf')).json()) as { csrfToken: string };
  return request.post('/api/auth/callback/credentials', {
    form: { csrfToken: csrf.csrfToken, email, password, json: 'true', callbackUrl: '/' },
  });
}

/** Signs a page in, faster than through the form. */
export async function signIn(page: Page, person: SignIn): Promise<void> {
  expect((await signInByRequest(page.request, person)).ok()).toBe(true);
}
