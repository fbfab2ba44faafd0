import type { Pool, PoolClient } from 'pg';
import type { Logger } from 'pino';

/** What goes to the mail server. */
export interface Outgoing {
  readonly messageId: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** Resolves once the server has taken the message. */
type Post = (message: Outgoing) => Promise<unknown>;

interface Row {
  readonly id: string;
  readonly kind: string;
  readonly to_address: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** The mail, held until the transaction ends; null when there is nothing left to send. */
async function hold(client: PoolClient, id: string): Promise<Row | null> {
  const { rows } = await client.query<Row>(
    `select id, kind, to_address, subject, text, html from mails
      where id = $1 and sent_at is null for update skip locked`,
    [id],
  );
  if (rows[0]) return rows[0];
  const held = await client.query('select 1 from mails where id = $1 and sent_at is null', [
    id,
  ]);
  if (held.rowCount) throw new Error('another worker is sending this mail');
  return null;
}

const noteSent = (client: PoolClient, id: string) =>
  client.query(
    `update mails set sent_at = now(), attempts = attempts + 1, last_error = null,
        text = case when secret then '' else text end,
        html = case when secret then '' else html end
      where id = $1`,
    [id],
  );

const noteFailure = (client: PoolClient, id: string, error: unknown) =>
  client.query(
    'update mails set attempts = attempts + 1, last_error = left($2, 300) where id = $1',
    [id, error instanceof Error ? error.message : String(error)],
  );

/**
 * Sends mails that stand in the database, each once: the row is held while it is sent, and what
 * the server has taken is remembered here until the database has it too, should that be gone in
 * between. If this very process dies in between, the mail goes out again under the same
 * Message-ID, by which the receiver knows it.
 */
export function mailSender(
  pool: Pick<Pool, 'connect'>,
  post: Post,
  /** Behind the @ of Message-IDs. */
  domain: string,
  log: Logger,
): (id: string) => Promise<void> {
  const posted = new Map<string, Promise<unknown>>();

  /** Under way, or taken and not noted yet: that one is waited for and no other begun. */
  function deliver({ id, to_address: to, subject, text, html }: Row): Promise<unknown> {
    const known = posted.get(id);
    if (known) return known;
    const delivery = post({ messageId: `<${id}@${domain}>`, to, subject, text, html });
    posted.set(id, delivery);
    delivery.catch(() => posted.delete(id));
    return delivery;
  }

  /** Whether it is out; an error that stands in the row by now. */
  async function attempt(client: PoolClient, id: string): Promise<Error | null> {
    const mail = await hold(client, id);
    if (!mail) return null;
    try {
      await deliver(mail);
    } catch (error) {
      await noteFailure(client, id, error);
      return error instanceof Error ? error : new Error(String(error));
    }
    await noteSent(client, id);
    log.info({ mail: id, kind: mail.kind }, 'mail sent');
    return null;
  }

  return async (id) => {
    const client = await pool.connect();
    let failure: Error | null;
    try {
      await client.query('begin');
      failure = await attempt(client, id);
      await client.query('commit');
    } catch (error) {
      // A connection in doubt is not used again; the database rolls back what it had.
      client.release(true);
      throw error;
    }
    client.release();
    if (failure) throw failure;
    posted.delete(id);
  };
}
