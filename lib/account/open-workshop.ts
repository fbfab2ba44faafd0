import 'server-only';
import { randomUUID } from 'node:crypto';
import { Membership, User, Workshop } from '@/entities';
import { countSignUp } from '../attempts';
import { within } from '../db';
import { badInput } from '../errors';
import { addRecord } from '../record';
import { newWorkshopSchema } from '../schemas/account';
import { requirePerson } from './person';

/** Another workshop for somebody with an account, who owns it. @throws RequestError bad-input */
export async function openWorkshop(input: unknown): Promise<{ workshopId: string }> {
  const { userId } = await requirePerson();
  const parsed = newWorkshopSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  await countSignUp(userId);
  const workshopId = randomUUID();
  const name = parsed.data.workshop;
  await within({ user: userId, workshop: workshopId }, (tx) => {
    const workshop = tx.create(Workshop, { id: workshopId, name });
    tx.create(Membership, { user: tx.getReference(User, userId), workshop, role: 'owner' });
    addRecord(
      tx,
      { workshopId, userId },
      { what: 'workshop-opened', subject: workshopId, detail: { name } },
    );
  });
  return { workshopId };
}
