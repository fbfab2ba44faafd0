import 'server-only';
import { randomUUID } from 'node:crypto';
import {
  LockMode,
  UniqueConstraintViolationException,
  type EntityManager,
} from '@mikro-orm/postgresql';
import { Invitation, Membership, User, Workshop } from '@/entities';
import { findPerson } from '../account/person';
import { within } from '../db';
import { badInput, RequestError } from '../errors';
import { hashSecret } from '../link-secret';
import { hashPassword } from '../password';
import { addRecord } from '../record';
import { joinSchema, newPersonSchema } from '../schemas/account';
import { openInvitation, refuseDeadInvitation, type InvitationInHand } from './invitation-link';

/** Uses up the invitation for one person: of two at once, the second finds it used. */
async function join(tx: EntityManager, tokenHash: string, userId: string): Promise<void> {
  const invitation = await tx.findOne(
    Invitation,
    { tokenHash },
    { lockMode: LockMode.PESSIMISTIC_WRITE },
  );
  refuseDeadInvitation(invitation);
  const { workshop, role } = invitation;
  const known = await tx.findOne(Membership, { workshop, user: userId });
  if (known && !known.removedAt) {
    throw new RequestError('bad-input', 'You are a member of this workshop already.');
  }
  if (known) Object.assign(known, { removedAt: null, role });
  else {
    tx.create(Membership, {
      user: tx.getReference(User, userId),
      workshop: tx.getReference(Workshop, workshop.id),
      role,
    });
  }
  invitation.usedAt = new Date();
  addRecord(
    tx,
    { workshopId: workshop.id, userId },
    { what: 'member-joined', subject: userId, detail: { role, again: known !== null } },
  );
}

const scopeOf = (invitation: InvitationInHand, token: string, user: string) => ({
  workshop: invitation.workshopId,
  user,
  token,
});

/** With a new account, made in the same transaction. @throws RequestError bad-input */
async function joinAsNew(
  invitation: InvitationInHand,
  token: string,
  input: unknown,
): Promise<void> {
  const parsed = newPersonSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { name, password } = parsed.data;
  const passwordHash = await hashPassword(password);
  const id = randomUUID();
  try {
    await within(scopeOf(invitation, token, id), async (tx) => {
      tx.create(User, { id, email: invitation.email, name, passwordHash });
      await tx.flush();
      await join(tx, token, id);
    });
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    throw new RequestError(
      'bad-input',
      `${invitation.email} has an account here by now; sign in with it to join.`,
    );
  }
}

/**
 * Lets whoever holds the link into its workshop: the person who is signed in, if the invitation is
 * theirs, or else a new one with name and password.
 * @throws RequestError not-found for a dead link, not-allowed for another's, bad-input
 */
export async function joinWorkshop(
  input: unknown,
): Promise<{ email: string; workshopId: string }> {
  const parsed = joinSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const token = hashSecret(parsed.data.secret);
  const invitation = await openInvitation(parsed.data.secret);
  const person = await findPerson();
  if (!person) await joinAsNew(invitation, token, input);
  else if (person.email === invitation.email) {
    await within(scopeOf(invitation, token, person.userId), (tx) =>
      join(tx, token, person.userId),
    );
  } else {
    throw new RequestError(
      'not-allowed',
      `This invitation is for ${invitation.email}, and you are signed in as ${person.email}. Sign out first.`,
    );
  }
  return { email: invitation.email, workshopId: invitation.workshopId };
}

/** Has the person whom the invitation in hand asks an account already? */
export async function isKnown({ email }: InvitationInHand): Promise<boolean> {
  return (await within({ email }, (tx) => tx.count(User, { email }))) > 0;
}
