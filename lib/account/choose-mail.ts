import 'server-only';
import { Membership } from '@/entities';
import { within } from '../db';
import { badInput } from '../errors';
import { chooseMailSchema, type OwnWorkshop } from '../schemas/account';
import { ownWorkshop, requirePerson } from './person';

/**
 * What the person who asks does not want mail about, in one of their workshops.
 * @throws RequestError not-found, bad-input
 */
export async function chooseMail(workshopId: string, input: unknown): Promise<OwnWorkshop> {
  const person = await requirePerson();
  const workshop = ownWorkshop(person, workshopId);
  const parsed = chooseMailSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const muted = [...new Set(parsed.data.muted)];
  await within({ workshop: workshop.id, user: person.userId }, (tx) =>
    tx.nativeUpdate(
      Membership,
      { workshop: workshop.id, user: person.userId, removedAt: null },
      { mutedMail: muted },
    ),
  );
  return { ...workshop, muted };
}
