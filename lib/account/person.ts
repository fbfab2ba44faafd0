import 'server-only';
import { cache } from 'react';
import { Membership, User } from '@/entities';
import { signedInUser } from '../auth';
import { within } from '../db';
import { RequestError } from '../errors';
import type { OwnWorkshop } from '../schemas/account';

/** Who is signed in, with every workshop they belong to, which may be none. */
export interface Person {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly workshops: readonly OwnWorkshop[];
}

/** The person behind the session, or null; asked of the database once per render. */
export const findPerson = cache(async (): Promise<Person | null> => {
  const session = await signedInUser();
  if (session === null) return null;
  return within({ user: session.userId }, async (tx) => {
    const user = await tx.findOne(User, { id: session.userId });
    if (!user || user.sessionEpoch !== session.epoch) return null;
    const memberships = await tx.find(
      Membership,
      { user, removedAt: null },
      { populate: ['workshop'], orderBy: { createdAt: 'asc', id: 'asc' } },
    );
    return {
      userId: user.id,
      name: user.name,
      email: user.email,
      workshops: memberships.map(({ workshop, role, mutedMail }) => ({
        id: workshop.id,
        name: workshop.name,
        role,
        muted: mutedMail,
      })),
    };
  });
});

/** The guard of what concerns one's own account. @throws RequestError not-signed-in */
export async function requirePerson(): Promise<Person> {
  const person = await findPerson();
  if (!person)
    throw new RequestError('not-signed-in', 'You are not signed in; sign in and try again.');
  return person;
}

/** One of the person's own workshops. @throws RequestError not-found */
export function ownWorkshop({ workshops }: Person, id: unknown): OwnWorkshop {
  const found = workshops.find((workshop) => workshop.id === id);
  if (found) return found;
  throw new RequestError('not-found', 'No such workshop of yours; you may have been removed.');
}
