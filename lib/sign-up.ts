import 'server-only';
import { randomUUID } from 'node:crypto';
import { UniqueConstraintViolationException } from '@mikro-orm/postgresql';
import { Membership, User, Workshop } from '@/entities';
import { countSignUp } from './attempts';
import { within } from './db';
import { badInput, RequestError } from './errors';
import { hashPassword } from './password';
import { addRecord } from './record';
import { signUpSchema } from './schemas/account';

/**
 * Opens a workshop with its owner, both or neither.
 * @throws RequestError bad-input naming the field, or too-many.
 */
export async function signUp(input: unknown, address: string): Promise<{ userId: string }> {
  const parsed = signUpSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { workshop: workshopName, name, email, password } = parsed.data;
  await countSignUp(address);

  const passwordHash = await hashPassword(password);
  const [userId, workshopId] = [randomUUID(), randomUUID()];
  try {
    return await within({ user: userId, workshop: workshopId }, (tx) => {
      const user = tx.create(User, { id: userId, email, name, passwordHash });
      const workshop = tx.create(Workshop, { id: workshopId, name: workshopName });
      tx.create(Membership, { user, workshop, role: 'owner' });
      addRecord(
        tx,
        { workshopId: workshop.id, userId: user.id },
        {
          what: 'workshop-opened',
          subject: workshop.id,
          detail: { name: workshopName },
        },
      );
      return { userId };
    });
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    throw new RequestError(
      'bad-input',
      'Email: already has an account here; sign in with it, or use another.',
      { field: 'email' },
    );
  }
}
