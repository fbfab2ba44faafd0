import 'server-only';
import { LockMode } from '@mikro-orm/postgresql';
import { PasswordReset, User } from '@/entities';
import { countOwnPassword } from '../attempts';
import { within } from '../db';
import { badInput, RequestError } from '../errors';
import { hashPassword, verifyPassword } from '../password';
import { changePasswordSchema } from '../schemas/account';
import { requirePerson } from './person';

/**
 * Sets a new password for somebody who knows the old one, and ends all sessions: this browser
 * signs in anew with it.
 * @throws RequestError bad-input, too-many
 */
export async function changePassword(input: unknown): Promise<{ email: string }> {
  const person = await requirePerson();
  const parsed = changePasswordSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { current, password } = parsed.data;
  await countOwnPassword(person.userId);
  const passwordHash = await hashPassword(password);
  await within({ user: person.userId }, async (tx) => {
    const user = await tx.findOneOrFail(
      User,
      { id: person.userId },
      { lockMode: LockMode.PESSIMISTIC_WRITE },
    );
    if (!(await verifyPassword(user.passwordHash, current))) {
      throw new RequestError('bad-input', 'Password now: not right; type it again.', {
        field: 'current',
      });
    }
    user.passwordHash = passwordHash;
    user.sessionEpoch += 1;
    await tx.nativeUpdate(PasswordReset, { user, usedAt: null }, { usedAt: new Date() });
  });
  return { email: person.email };
}
