import 'server-only';
import { createHash } from 'node:crypto';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { pool } from './db';
import { RequestError } from './errors';

const MINUTE = 60;

/** Points and seconds of each limit. Kept in the database, so all processes count together. */
const limits = {
  /** One address, one email: a person who mistypes has room, a guesser hasn't. */
  signInPair: { points: 8, duration: 15 * MINUTE },
  /** One address over all emails. */
  signInAddress: { points: 60, duration: 15 * MINUTE },
  /** One email over all addresses, for a guesser with many of them. */
  signInEmail: { points: 40, duration: 60 * MINUTE },
  signUpAddress: { points: 10, duration: 60 * MINUTE },
  /** Resets asked for from one address, and for one email. */
  resetAddress: { points: 20, duration: 60 * MINUTE },
  resetEmail: { points: 8, duration: 60 * MINUTE },
  /** Mail that one owner has sent to addresses of their choice. */
  invitation: { points: 60, duration: 60 * MINUTE },
  /** One person's own password, asked again. */
  ownPassword: { points: 10, duration: 15 * MINUTE },
} as const;
type Limit = keyof typeof limits;

function limiter(limit: Limit): RateLimiterPostgres {
  return new RateLimiterPostgres({
    storeClient: pool(),
    tableName: 'sign_in_attempts',
    tableCreated: true,
    keyPrefix: limit,
    ...limits[limit],
  });
}

const limiters = new Map<Limit, RateLimiterPostgres>();

function of(limit: Limit): RateLimiterPostgres {
  let known = limiters.get(limit);
  if (!known) limiters.set(limit, (known = limiter(limit)));
  return known;
}

/** Keys are hashed: bounded in length, and the table holds nobody's email. */
const keyOf = (value: string) => createHash('sha256').update(value).digest('base64url');

/** Counts one attempt. @throws RequestError too-many, with the minutes to wait. */
async function count(limit: Limit, value: string): Promise<void> {
  try {
    await of(limit).consume(keyOf(value));
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    const minutes = Math.max(1, Math.ceil(refusal.msBeforeNext / 60_000));
    throw new RequestError(
      'too-many',
      `Too many attempts; wait ${minutes} ${minutes === 1 ? 'minute' : 'minutes'} and try again.`,
    );
  }
}

/** Counted before the password is looked at, so that attempts side by side count too. */
export async function countSignIn(email: string, address: string): Promise<void> {
  await count('signInAddress', address);
  await count('signInPair', `${address} ${email}`);
  await count('signInEmail', email);
}

/** After the right password: only wrong ones count. */
export async function forgiveSignIn(email: string, address: string): Promise<void> {
  await of('signInPair').delete(keyOf(`${address} ${email}`));
  await of('signInAddress').reward(keyOf(address));
  await of('signInEmail').reward(keyOf(email));
}

export const countSignUp = (address: string): Promise<void> => count('signUpAddress', address);

/** Counted whether or not anybody has that email. */
export async function countReset(email: string, address: string): Promise<void> {
  await count('resetAddress', address);
  await count('resetEmail', email);
}

export const countInvitation = (userId: string): Promise<void> => count('invitation', userId);

export const countOwnPassword = (userId: string): Promise<void> => count('ownPassword', userId);

/**
 * The address a request comes from: the last of X-Forwarded-For, which the nearest proxy wrote,
 * or Next's server itself where there is no proxy. Earlier ones are whatever the client says.
 */
export function addressOf(forwardedFor: string | null | undefined): string {
  return forwardedFor?.split(',').at(-1)?.trim().slice(0, 64) || 'unknown';
}
