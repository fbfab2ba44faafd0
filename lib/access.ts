import 'server-only';
import { cache } from 'react';
import { redirect } from 'next/navigation';
import { Membership } from '@/entities';
import { signedInUser } from './auth';
import { chosenWorkshop } from './chosen-workshop';
import { within } from './db';
import { RequestError } from './errors';
import type { Role } from './schemas/api';

/** Who asks: a member of one workshop, as the database has it now. */
export interface Viewer {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly workshopId: string;
  readonly workshopName: string;
}

/** The one table of who may what. */
const may = {
  owner: {
    read: true,
    download: true,
    edit: true,
    release: true,
    waive: true,
    order: true,
    cut: true,
    people: true,
    record: true,
  },
  builder: {
    read: true,
    download: true,
    edit: true,
    release: true,
    waive: false,
    order: true,
    cut: true,
    people: false,
    record: true,
  },
  machinist: {
    read: true,
    download: true,
    edit: false,
    release: false,
    waive: false,
    order: false,
    cut: true,
    people: false,
    record: false,
  },
} as const satisfies Record<Role, Record<string, boolean>>;

/** May this role create, save, restore and delete designs, machines and sheet? */
export const mayEdit = (role: Role): boolean => may[role].edit;
export const mayRead = (role: Role): boolean => may[role].read;
export const mayDownload = (role: Role): boolean => may[role].download;

/**
 * The person behind the session, in the workshop they have chosen or else their first; or null.
 * Asked of the database every time, so a session dies with the membership or when it is ended
 * everywhere; once per render in a page.
 */
export const findViewer = cache(async (): Promise<Viewer | null> => {
  const session = await signedInUser();
  if (session === null) return null;
  const wanted = await chosenWorkshop();
  return within({ user: session.userId }, async (tx) => {
    const memberships = await tx.find(
      Membership,
      { user: session.userId, removedAt: null },
      { populate: ['user', 'workshop'], orderBy: { createdAt: 'asc', id: 'asc' } },
    );
    const membership =
      memberships.find(({ workshop }) => workshop.id === wanted) ?? memberships[0];
    if (!membership || membership.user.sessionEpoch !== session.epoch) return null;
    const { user, workshop, role } = membership;
    return {
      userId: user.id,
      name: user.name,
      email: user.email,
      role,
      workshopId: workshop.id,
      workshopName: workshop.name,
    };
  });
});

/** The guard of routes and actions. @throws RequestError not-signed-in or not-allowed. */
export async function requireMember(allowed?: (role: Role) => boolean): Promise<Viewer> {
  const viewer = await findViewer();
  if (!viewer)
    throw new RequestError('not-signed-in', 'You are not signed in; sign in and try again.');
  if (allowed && !allowed(viewer.role)) {
    throw new RequestError(
      'not-allowed',
      `A ${viewer.role} may not do this; ask a builder or the owner of ${viewer.workshopName}.`,
    );
  }
  return viewer;
}

/** The guard of pages: whoever is not signed in is sent to do so. */
export async function requirePageMember(): Promise<Viewer> {
  return (await findViewer()) ?? redirect('/sign-in');
}
