import 'server-only';
import { LockMode } from '@mikro-orm/postgresql';
import { PasswordReset, User } from '@/entities';
import { forgiveSignIn } from '../attempts';
import { within } from '../db';
import { badInput, RequestError } from '../errors';
import { hashSecret } from '../link-secret';
import { hashPassword } from '../password';
import { resetSchema } from '../schemas/account';

const deadWords = {
  unknown: 'This link opens nothing here. Check that all of it was copied from the mail.',
  used: 'This link has been used; it opens once. Ask for another if you need one.',
  expired: 'This link has expired. Ask for another.',
} as const;

function refuseDeadReset(found: PasswordReset | null): asserts found {
  const state = !found
    ? 'unknown'
    : found.usedAt
      ? 'used'
      : found.expiresAt <= new Date()
        ? 'expired'
        : null;
  if (state) throw new RequestError('not-found', deadWords[state]);
}

/** Whose password a link's secret changes. @throws RequestError not-found with the reason */
export async function openReset(secret: string): Promise<{ userId: string; email: string }> {
  const tokenHash = hashSecret(secret);
  const found = await within({ token: tokenHash }, (tx) =>
    tx.findOne(PasswordReset, { tokenHash }, { populate: ['user'] }),
  );
  refuseDeadReset(found);
  return { userId: found.user.id, email: found.user.email };
}

/**
 * Sets a new password by the link from the mail, and ends all sessions and other such links.
 * @throws RequestError bad-input, not-found for a dead link
 */
export async function resetPassword(
  input: unknown,
  address: string,
): Promise<{ email: string }> {
  const parsed = resetSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { secret, password } = parsed.data;
  const { userId, email } = await openReset(secret);
  const passwordHash = await hashPassword(password);
  const token = hashSecret(secret);
  await within({ user: userId, token }, async (tx) => {
    // The person's row first: two links at once are one after the other.
    const user = await tx.findOneOrFail(
      User,
      { id: userId },
      { lockMode: LockMode.PESSIMISTIC_WRITE },
    );
    refuseDeadReset(await tx.findOne(PasswordReset, { tokenHash: token }));
    user.passwordHash = passwordHash;
    user.sessionEpoch += 1;
    await tx.nativeUpdate(PasswordReset, { user, usedAt: null }, { usedAt: new Date() });
  });
  await forgiveSignIn(email, address);
  return { email };
}
