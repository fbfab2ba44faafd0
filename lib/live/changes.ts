import 'server-only';
import { Client } from 'pg';
import { env } from '../env';
import { log } from '../log';

/** What the database tells after each commit that added to the record (migrations/007). */
export interface Change {
  readonly id: string;
  readonly workshop: string;
  readonly what: string;
  readonly subject: string;
  readonly revision: string | null;
}

/** One open screen. */
export interface Follower {
  readonly workshop: string;
  /** Something was recorded. */
  readonly tell: (change: Change) => void;
  /** Changes may have been missed: look at everything again. */
  readonly lookAgain: () => void;
  readonly end: () => void;
}

const CHANNEL = 'vaneloft_changes';

/** Milliseconds between attempts to listen again, doubled up to the last. */
const FIRST_WAIT = 250;
const LAST_WAIT = 5_000;

/** One listening connection of this process, whoever follows. */
class Changes {
  private readonly followers = new Set<Follower>();
  private listening = false;
  private wait = FIRST_WAIT;

  follow(follower: Follower): () => void {
    this.followers.add(follower);
    if (!this.listening) {
      this.listening = true;
      void this.listen();
    }
    return () => this.followers.delete(follower);
  }

  /** Ends every open screen's stream: they come back, to another process if this one goes. */
  endAll(): void {
    for (const follower of [...this.followers]) follower.end();
  }

  private async listen(): Promise<void> {
    const client = new Client({ connectionString: env().DATABASE_URL, keepAlive: true });
    let over = false;
    const again = (error?: unknown): void => {
      if (over) return;
      over = true;
      if (error) log.warn({ err: error }, 'stopped hearing of changes; trying again');
      void client.end().catch(() => undefined);
      setTimeout(() => void this.listen(), this.wait).unref();
      this.wait = Math.min(LAST_WAIT, 2 * this.wait);
    };
    client.on('error', again);
    client.on('end', () => again());
    client.on('notification', ({ payload }) => this.pass(payload ?? ''));
    try {
      await client.connect();
      await client.query(`listen ${CHANNEL}`);
      this.wait = FIRST_WAIT;
      for (const follower of [...this.followers]) follower.lookAgain();
    } catch (error) {
      again(error);
    }
  }

  private pass(payload: string): void {
    const change = JSON.parse(payload) as Change;
    for (const follower of [...this.followers]) {
      if (follower.workshop === change.workshop) follower.tell(change);
    }
  }
}

// On globalThis, because Next loads this file once per bundle.
const store = globalThis as typeof globalThis & { vaneloftChanges?: Changes };

export const changes = (): Changes => (store.vaneloftChanges ??= new Changes());
