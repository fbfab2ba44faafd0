import 'server-only';
import { randomUUID } from 'node:crypto';
import { PasswordReset, User } from '@/entities';
import { countReset } from '../attempts';
import { within } from '../db';
import { badInput } from '../errors';
import { makeSecret } from '../link-secret';
import { addMail } from '../mail/add-mail';
import { askResetSchema } from '../schemas/account';

/** Minutes that the link opens. */
const MINUTES = 60;

/** Shortest time to an answer, ms: longer than the work, so that it tells nothing. */
const ANSWER_AFTER = 250;

async function sendReset(email: string): Promise<void> {
  const user = await within({ email }, (tx) => tx.findOne(User, { email }));
  if (!user) return;
  const { secret, hash } = makeSecret();
  await within({ user: user.id, email }, (tx) => {
    const id = randomUUID();
    tx.create(PasswordReset, {
      id,
      user: tx.getReference(User, user.id),
      tokenHash: hash,
      expiresAt: new Date(Date.now() + MINUTES * 60_000),
    });
    addMail(tx, {
      workshopId: null,
      kind: 'reset',
      event: `reset:${id}`,
      to: email,
      secret: true,
      letter: {
        subject: 'A new password for Vaneloft',
        lines: [
          `Somebody, most likely you, asked for a new password for ${email}.`,
          `The link opens once, within the next ${MINUTES} minutes. If it was not you, leave it alone: your password stays as it is.`,
        ],
        link: { path: `/reset/${secret}`, label: 'Choose a new password' },
      },
    });
  });
}

/**
 * Mails a link for a new password to whoever has that email. The answer is the same for
 * everybody, in words and in time.
 * @throws RequestError bad-input, too-many
 */
export async function askReset(input: unknown, address: string): Promise<void> {
  const parsed = askResetSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { email } = parsed.data;
  await countReset(email, address);
  await Promise.all([
    sendReset(email),
    new Promise((resolve) => setTimeout(resolve, ANSWER_AFTER)),
  ]);
}
