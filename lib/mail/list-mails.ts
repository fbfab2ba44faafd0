import 'server-only';
import { Mail, Membership } from '@/entities';
import { mayManagePeople, type Viewer } from '../access';
import { inWorkshop, within } from '../db';
import type { SentMail, SentMails } from '../schemas/mail';
import { receivedMail } from './received';

/** Mails shown, the newest. */
const SHOWN = 200;

type Received = NonNullable<Awaited<ReturnType<typeof receivedMail>>>;

function toSentMail(mail: Mail, received: Received | null): SentMail {
  const message = received?.get(mail.id);
  return {
    id: mail.id,
    kind: mail.kind,
    to: mail.toAddress,
    subject: mail.subject,
    at: mail.createdAt.toISOString(),
    sentAt: mail.sentAt?.toISOString() ?? null,
    attempts: mail.attempts,
    lastError: mail.lastError ?? null,
    words: message ? { text: message.text, html: message.html } : null,
  };
}

/** New-password mails to members: of no workshop, and shown only where nobody else gets them. */
async function resets(viewer: Viewer, ofWorkshop: Set<string>, received: Received) {
  const members = await inWorkshop(viewer, (tx) =>
    tx.find(
      Membership,
      { workshop: viewer.workshopId, removedAt: null },
      { populate: ['user'] },
    ),
  );
  const written = new Set(
    [...received].flatMap(([id, { to }]) => (ofWorkshop.has(id) ? [] : to)),
  );
  const found = await Promise.all(
    members
      .filter(({ user }) => written.has(user.email))
      .map(({ user: { email } }) =>
        within({ email }, (tx) =>
          tx.find(
            Mail,
            { workshop: null, toAddress: email },
            { orderBy: { createdAt: 'desc' }, limit: SHOWN },
          ),
        ),
      ),
  );
  return found.flat();
}

/** What the workshop's mail told whom, newest first, and what became of it. */
export async function listMails(viewer: Viewer): Promise<SentMails> {
  const received = await receivedMail();
  const standIn = received !== null;
  if (!mayManagePeople(viewer.role)) return { mails: [], standIn };
  const mails = await inWorkshop(viewer, (tx) =>
    tx.find(
      Mail,
      { workshop: viewer.workshopId },
      { orderBy: { createdAt: 'desc', id: 'asc' }, limit: SHOWN },
    ),
  );
  const ofWorkshop = new Set(mails.map(({ id }) => id));
  const others = received ? await resets(viewer, ofWorkshop, received) : [];
  return {
    mails: [...mails, ...others]
      .sort((a, b) => b.createdAt.getTime() - a.createdAt.getTime())
      .slice(0, SHOWN)
      .map((mail) => toSentMail(mail, received)),
    standIn,
  };
}
