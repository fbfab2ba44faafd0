import 'server-only';
import { randomUUID } from 'node:crypto';
import { Invitation, Membership, User, Workshop } from '@/entities';
import { mayManagePeople, requireMember } from '../access';
import { countInvitation } from '../attempts';
import { inWorkshop } from '../db';
import { badInput, RequestError } from '../errors';
import { makeSecret } from '../link-secret';
import { addMail } from '../mail/add-mail';
import { addRecord } from '../record';
import { inviteSchema } from '../schemas/people';
import { lockPeople } from './lock-people';

/** Days that the link opens the workshop. */
const DAYS = 7;

/**
 * Asks somebody into the workshop by mail. An invitation that the address already has is
 * withdrawn: only the newest link opens.
 * @throws RequestError bad-input, too-many
 */
export async function invitePerson(input: unknown): Promise<{ id: string }> {
  const viewer = await requireMember(mayManagePeople);
  const parsed = inviteSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { email, role } = parsed.data;
  await countInvitation(viewer.userId);
  const { secret, hash } = makeSecret();
  return inWorkshop(viewer, async (tx) => {
    await lockPeople(tx, viewer);
    const workshop = viewer.workshopId;
    const member = await tx.findOne(Membership, { workshop, removedAt: null, user: { email } });
    if (member) {
      throw new RequestError(
        'bad-input',
        `Email: ${email} is a member already; change their role in the list.`,
        { field: 'email' },
      );
    }
    const now = new Date();
    await tx.nativeUpdate(
      Invitation,
      { workshop, email, usedAt: null, withdrawnAt: null },
      { withdrawnAt: now },
    );
    const id = randomUUID();
    tx.create(Invitation, {
      id,
      workshop: tx.getReference(Workshop, workshop),
      email,
      role,
      tokenHash: hash,
      invitedBy: tx.getReference(User, viewer.userId),
      expiresAt: new Date(now.getTime() + DAYS * 24 * 3_600_000),
    });
    addMail(tx, {
      workshopId: workshop,
      kind: 'invitation',
      event: `invitation:${id}`,
      to: email,
      secret: true,
      letter: {
        subject: `${viewer.name} asks you into ${viewer.workshopName}`,
        lines: [
          `${viewer.name} (${viewer.email}) asks you into the workshop ${viewer.workshopName} at Vaneloft, as ${role}.`,
          `The link opens once, until ${DAYS} days from now. If you do not know what this is about, leave it alone.`,
        ],
        link: { path: `/join/${secret}`, label: `Join ${viewer.workshopName}` },
      },
    });
    addRecord(tx, viewer, { what: 'member-invited', subject: id, detail: { email, role } });
    return { id };
  });
}
