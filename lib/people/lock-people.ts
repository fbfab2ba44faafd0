import 'server-only';
import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { Membership } from '@/entities';
import { mayManagePeople, type Viewer } from '../access';
import { RequestError } from '../errors';
import { idSchema } from '../schemas/id';

/**
 * One at a time in a workshop changes who belongs to it. Whoever waited may have been removed
 * meanwhile, so that is asked again.
 * @throws RequestError not-allowed
 */
export async function lockPeople(tx: EntityManager, viewer: Viewer): Promise<void> {
  await tx.execute('select 1 from workshops where id = ? for no key update', [
    viewer.workshopId,
  ]);
  const mine = await tx.findOne(Membership, {
    workshop: viewer.workshopId,
    user: viewer.userId,
    removedAt: null,
  });
  if (!mine || !mayManagePeople(mine.role)) {
    throw new RequestError(
      'not-allowed',
      `You are no longer an owner of ${viewer.workshopName}; nothing was changed.`,
    );
  }
}

/** A member by their id as a person. @throws RequestError not-found */
export async function findMember(
  tx: EntityManager,
  viewer: Viewer,
  userId: string,
): Promise<Loaded<Membership, 'user'>> {
  const found =
    idSchema.safeParse(userId).success &&
    (await tx.findOne(
      Membership,
      { workshop: viewer.workshopId, user: userId, removedAt: null },
      { populate: ['user'] },
    ));
  if (found) return found;
  throw new RequestError(
    'not-found',
    'No such member in your workshop; they may have been removed.',
  );
}

/** @throws RequestError bad-input when the workshop would be left without an owner */
export async function refuseLastOwner(
  tx: EntityManager,
  viewer: Viewer,
  member: Loaded<Membership, 'user'>,
): Promise<void> {
  if (member.role !== 'owner') return;
  const owners = await tx.count(Membership, {
    workshop: viewer.workshopId,
    role: 'owner',
    removedAt: null,
  });
  if (owners > 1) return;
  throw new RequestError(
    'bad-input',
    `Role: ${member.user.name} is the only owner of ${viewer.workshopName}; make somebody else an owner first.`,
    { field: 'role' },
  );
}
