import 'server-only';
import { User } from '@/entities';
import { within } from '../db';
import { badInput } from '../errors';
import { ownNameSchema } from '../schemas/account';
import { requirePerson } from './person';

/** The name by which others see the person who asks. @throws RequestError bad-input */
export async function setOwnName(input: unknown): Promise<{ name: string }> {
  const { userId } = await requirePerson();
  const parsed = ownNameSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { name } = parsed.data;
  await within({ user: userId }, (tx) => tx.nativeUpdate(User, { id: userId }, { name }));
  return { name };
}
