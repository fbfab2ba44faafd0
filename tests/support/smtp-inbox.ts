/** A mail server on loopback that keeps what it takes, and refuses it when told to. */

import { simpleParser, type ParsedMail } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export interface Inbox {
  readonly url: string;
  readonly messages: ParsedMail[];
  /** Refuses the next messages, after having read them. */
  refuse: number;
  /** Waits so long before it takes one, ms. */
  delay: number;
  close: () => Promise<void>;
}

export async function openInbox(): Promise<Inbox> {
  const messages: ParsedMail[] = [];
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    onData(stream, _session, done) {
      void simpleParser(stream).then(async (message) => {
        await new Promise((resolve) => setTimeout(resolve, inbox.delay));
        if (inbox.refuse > 0) {
          inbox.refuse -= 1;
          done(Object.assign(new Error('not now'), { responseCode: 451 }));
          return;
        }
        messages.push(message);
        done();
      });
    },
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.server.address() as { port: number };
  const inbox: Inbox = {
    url: `smtp://127.0.0.1:${port}`,
    messages,
    refuse: 0,
    delay: 0,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  };
  return inbox;
}
