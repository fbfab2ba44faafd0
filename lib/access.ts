import 'server-only';
import { cache } from 'react';
import { redirect } from 'next/navigation';
import { Membership } from '@/entities';
import { findPerson } from './account/person';
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
export const mayManagePeople = (role: Role): boolean => may[role].people;
/** May this role say that a revision is the one to cut, or no longer? */
export const mayRelease = (role: Role): boolean => may[role].release;
/** May this role release in spite of a check that fails? */
export const mayWaive = (role: Role): boolean => may[role].waive;
export const mayReadRecord = (role: Role): boolean => may[role].record;
export const mayDownload = (role: Role): boolean => may[role].download;
/** May this role ask for cutting, answer questions about it, and cancel it? */
export const mayOrder = (role: Role): boolean => may[role].order;
/** May this role take an order, return it with a question, and finish it? */
export const mayCut = (role: Role): boolean => may[role].cut;

/** A signed-in person with the epoch of the session that they came with. */
interface Session {
  readonly viewer: Viewer;
  readonly epoch: number;
}

/**
 * What somebody is in a workshop, or in their first one when `wanted` is none of theirs; null
 * when they belong to none, or their sessions of that epoch have been ended.
 */
async function viewerIn(
  userId: string,
  epoch: number,
  wanted: string | null,
): Promise<Viewer | null> {
  return within({ user: userId }, async (tx) => {
    const memberships = await tx.find(
      Membership,
      { user: userId, removedAt: null },
      { populate: ['user', 'workshop'], orderBy: { createdAt: 'asc', id: 'asc' } },
    );
    const membership =
      memberships.find(({ workshop }) => workshop.id === wanted) ?? memberships[0];
    if (!membership || membership.user.sessionEpoch !== epoch) return null;
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
}

/** Does this person still belong to the workshop, with sessions of that epoch? */
export async function isStillMember(
  { userId, workshopId }: Viewer,
  epoch: number,
): Promise<boolean> {
  return (await viewerIn(userId, epoch, workshopId))?.workshopId === workshopId;
}

/**
 * The session, in the workshop that the person has chosen or else their first. Asked of the
 * database every time, so it dies with the membership or when it is ended everywhere; once per
 * render in a page.
 */
const findSession = cache(async (): Promise<Session | null> => {
  const session = await signedInUser();
  if (session === null) return null;
  const { userId, epoch } = session;
  const viewer = await viewerIn(userId, epoch, await chosenWorkshop());
  return viewer && { viewer, epoch };
});

/** The person behind the session, or null. */
export const findViewer = async (): Promise<Viewer | null> =>
  (await findSession())?.viewer ?? null;

/** The session of a request that goes on. @throws RequestError not-signed-in */
export async function requireSession(): Promise<Session> {
  const session = await findSession();
  if (!session)
    throw new RequestError('not-signed-in', 'You are not signed in; sign in and try again.');
  return session;
}

/** The guard of routes and actions. @throws RequestError not-signed-in or not-allowed. */
export async function requireMember(allowed?: (role: Role) => boolean): Promise<Viewer> {
  const { viewer } = await requireSession();
  if (allowed && !allowed(viewer.role)) {
    throw new RequestError(
      'not-allowed',
      `A ${viewer.role} may not do this; ask a builder or the owner of ${viewer.workshopName}.`,
    );
  }
  return viewer;
}

/** The guard of pages: whoever is not signed in is sent to do so; who has no workshop is told. */
export async function requirePageMember(): Promise<Viewer> {
  const viewer = await findViewer();
  return viewer ?? redirect((await findPerson()) ? '/account' : '/sign-in');
}
