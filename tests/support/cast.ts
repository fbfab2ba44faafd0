/** The people that a test sends: one workshop with every role, and those who have no business. */

import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import {
  PARAMETERS_FORMAT,
  Design,
  Invitation,
  Membership,
  RecordEntry,
  ShopItem,
  User,
  Workshop,
} from '@/entities';
import { defaultDesign, type Design as Parameters } from '@/geometry';
import { keepVersion } from '@/lib/revisions/keep-version';
import { assessmentOf } from '@/lib/kernel/assessment';
import { deriveDesign } from '@/lib/kernel/derive-design';
import { makeSecret } from '@/lib/link-secret';
import { entityManager } from './as-owner';
import type { Role } from '@/lib/schemas/api';
import { askWith } from './request-context';

export const callers = [
  'owner',
  'builder',
  'machinist',
  'outsider',
  'removed',
  'signedOut',
] as const;
export type Caller = (typeof callers)[number];

interface Person {
  readonly id: string;
  readonly name: string;
  readonly cookie: string;
}

/** A cookie as next-auth's own encoder seals it. */
export async function cookieFor(userId: string, secret?: string, epoch = 0): Promise<string> {
  const token = await encode({
    token: { sub: userId, epoch },
    secret: secret ?? process.env.NEXTAUTH_SECRET!,
  });
  return `next-auth.session-token=${token}`;
}

export class Cast {
  private constructor(
    readonly workshopId: string,
    private readonly people: Partial<Record<Caller, Person>>,
  ) {}

  static async gather(): Promise<Cast> {
    const em = await entityManager();
    const people: Partial<Record<Caller, Person>> = {};
    const ours = em.create(Workshop, { id: randomUUID(), name: 'Harrow Lane' });
    const theirs = em.create(Workshop, { id: randomUUID(), name: 'Quarry End' });
    const join = async (caller: Caller, workshop: Workshop | null, role: Role) => {
      const id = randomUUID();
      const name = `Test ${caller}`;
      const email = `${caller.toLowerCase()}-${id}@test.example`;
      const user = em.create(User, { id, name, email, passwordHash: 'none' });
      if (workshop) em.create(Membership, { user, workshop, role });
      people[caller] = { id, name, cookie: await cookieFor(id) };
    };
    await join('owner', ours, 'owner');
    await join('builder', ours, 'builder');
    await join('machinist', ours, 'machinist');
    await join('outsider', theirs, 'owner');
    // Holds a session from when there was a membership.
    await join('removed', null, 'builder');
    await em.flush();
    return new Cast(ours.id, people);
  }

  person(caller: Exclude<Caller, 'signedOut'>): Person {
    return this.people[caller]!;
  }

  /** From now on this one asks. */
  ask(caller: Caller, headers: Record<string, string> = {}): void {
    const cookie = this.people[caller]?.cookie;
    askWith({ ...headers, ...(cookie && { cookie }) });
  }

  /** A stored design of ours, put there without any route. */
  async design(
    parameters: Parameters = defaultDesign(),
    name = 'Bench section',
  ): Promise<string> {
    const em = await entityManager();
    const id = randomUUID();
    const now = new Date();
    const builder = em.getReference(User, this.person('builder').id);
    const design = em.create(Design, {
      id,
      workshop: em.getReference(Workshop, this.workshopId),
      name,
      version: 1,
      parameters,
      parametersFormat: PARAMETERS_FORMAT,
      ...assessmentOf(deriveDesign(parameters)),
      createdBy: builder,
      updatedBy: builder,
      createdAt: now,
      updatedAt: now,
    });
    keepVersion(em, design);
    await em.flush();
    return id;
  }

  /** A machine or sheet of ours, put there without any route. */
  async item(
    kind: ShopItem['kind'],
    name: string,
    values: ShopItem['values'],
  ): Promise<string> {
    const em = await entityManager();
    const id = randomUUID();
    const now = new Date();
    em.create(ShopItem, {
      id,
      workshop: em.getReference(Workshop, this.workshopId),
      kind,
      name,
      values,
      updatedBy: em.getReference(User, this.person('builder').id),
      createdAt: now,
      updatedAt: now,
    });
    await em.flush();
    return id;
  }

  /** One more member of ours. Resolves to their id. */
  async member(role: Role): Promise<string> {
    const em = await entityManager();
    const id = randomUUID();
    const email = `${id}@test.example`;
    const user = em.create(User, { id, name: `Test ${id}`, email, passwordHash: 'none' });
    em.create(Membership, { user, workshop: em.getReference(Workshop, this.workshopId), role });
    await em.flush();
    return id;
  }

  /** An invitation into ours, and the secret of its link. */
  async invitation(
    given: Partial<Pick<Invitation, 'email' | 'role' | 'expiresAt'>> = {},
  ): Promise<{ id: string; email: string; secret: string }> {
    const em = await entityManager();
    const id = randomUUID();
    const { secret, hash } = makeSecret();
    const email = given.email ?? `${id}@test.example`;
    em.create(Invitation, {
      id,
      workshop: em.getReference(Workshop, this.workshopId),
      email,
      role: given.role ?? 'builder',
      tokenHash: hash,
      invitedBy: em.getReference(User, this.person('owner').id),
      expiresAt: given.expiresAt ?? new Date(Date.now() + 3_600_000),
    });
    await em.flush();
    return { id, email, secret };
  }

  /** The record's rows about one subject, oldest first. */
  async record(subject: string): Promise<RecordEntry[]> {
    const em = await entityManager();
    return em.find(RecordEntry, { subject }, { orderBy: { id: 'asc' } });
  }
}

/** The row as it stands. */
export async function storedDesign(id: string): Promise<Design> {
  return (await entityManager()).findOneOrFail(Design, id);
}
