import 'server-only';
import { z } from 'zod';
import { User } from '@/entities';
import { addressOf, countSignIn, forgiveSignIn } from './attempts';
import { within } from './db';
import { log } from './log';
import { verifyPassword } from './password';
import { emailSchema } from './schemas/account';

const credentialsSchema = z.object({
  email: emailSchema,
  password: z.string().min(1).max(200),
});

/** Who signed in, and the epoch their session belongs to. */
export interface SignedIn {
  readonly id: string;
  readonly epoch: number;
}

/**
 * The person whose email and password these are, or null.
 * @throws RequestError too-many when there were too many wrong ones.
 */
export async function signIn(
  credentials: unknown,
  headers: Record<string, unknown>,
): Promise<SignedIn | null> {
  const parsed = credentialsSchema.safeParse(credentials);
  if (!parsed.success) return null;
  const { email, password } = parsed.data;
  const forwarded = headers['x-forwarded-for'];
  const address = addressOf(typeof forwarded === 'string' ? forwarded : null);

  await countSignIn(email, address);
  const user = await within({ email }, (tx) => tx.findOne(User, { email }));
  if (!(await verifyPassword(user?.passwordHash, password)) || !user) {
    log.info({ address }, 'sign-in refused');
    return null;
  }
  await forgiveSignIn(email, address);
  log.info({ userId: user.id }, 'signed in');
  return { id: user.id, epoch: user.sessionEpoch };
}
