import { sql } from 'drizzle-orm';
import { Client } from 'pg';
import { databaseUrl, type Tx } from './client';

/** One channel for all; what a payload says is the services' business, which submission it is about is ours. */
const CHANNEL = 'plumbrow_submissions';
const FIRST_WAIT = 250;
const LONGEST_WAIT = 15_000;

export type Payload = Readonly<Record<string, unknown>>;
type Callback = (payload: Payload) => void;

/** Tells every process that listens, once the transaction commits. Keep it small: 8000 bytes at most. */
export async function notify(tx: Tx, submissionId: string, payload: Payload): Promise<void> {
  await tx.execute(
    sql`select pg_notify(${CHANNEL}, ${JSON.stringify({ ...payload, submission: submissionId })})`,
  );
}

/** One dedicated connection a process, opened with the first subscriber and closed with the last. */
class Listener {
  private readonly callbacks = new Map<string, Set<Callback>>();
  private client: Client | null = null;
  private retry: NodeJS.Timeout | null = null;
  private wait = FIRST_WAIT;
  /** Settled once the present connection listens, or is known not to. */
  established: Promise<void> = Promise.resolve();

  subscribe(submissionId: string, callback: Callback): () => void {
    const set = this.callbacks.get(submissionId) ?? new Set();
    this.callbacks.set(submissionId, set.add(callback));
    if (!this.client && !this.retry) this.connect();
    return () => this.unsubscribe(submissionId, callback);
  }

  private unsubscribe(submissionId: string, callback: Callback): void {
    const set = this.callbacks.get(submissionId);
    set?.delete(callback);
    if (set?.size === 0) this.callbacks.delete(submissionId);
    if (this.callbacks.size === 0) this.close();
  }

  private connect(): void {
    const client = new Client({ connectionString: databaseUrl(), application_name: 'plumbrow listener' });
    this.client = client;
    client.on('error', () => this.lost(client));
    client.on('end', () => this.lost(client));
    client.on('notification', (message) => this.deliver(message.payload ?? ''));
    this.established = client
      .connect()
      .then(() => client.query(`listen ${CHANNEL}`))
      .then(() => {
        // What happened while nobody listened is not known: have everyone look again.
        if (this.wait > FIRST_WAIT) this.deliverToAll({ kind: 'reconnected' });
        this.wait = FIRST_WAIT;
      })
      .catch(() => this.lost(client));
  }

  private lost(client: Client): void {
    if (this.client !== client) return;
    this.client = null;
    client.end().catch(() => undefined);
    this.retry = setTimeout(() => {
      this.retry = null;
      this.connect();
    }, this.wait);
    this.retry.unref();
    this.wait = Math.min(this.wait * 2, LONGEST_WAIT);
  }

  private deliver(text: string): void {
    const payload = JSON.parse(text) as Payload;
    for (const callback of this.callbacks.get(String(payload.submission)) ?? []) callback(payload);
  }

  private deliverToAll(payload: Payload): void {
    for (const set of this.callbacks.values()) for (const callback of set) callback(payload);
  }

  private close(): void {
    const client = this.client;
    this.client = null;
    if (this.retry) clearTimeout(this.retry);
    this.retry = null;
    this.wait = FIRST_WAIT;
    client?.end().catch(() => undefined);
  }
}

const holder = globalThis as typeof globalThis & { plumbrowListener?: Listener };

/**
 * Calls back with each payload sent for the submission, until the function returned is called.
 * `{kind: 'reconnected'}` comes after a gap in which payloads may have been missed.
 */
export function subscribe(submissionId: string, callback: Callback): () => void {
  holder.plumbrowListener ??= new Listener();
  return holder.plumbrowListener.subscribe(submissionId, callback);
}

/** Resolves once what is sent from then on is heard; with a database out of reach, once that is known. */
export async function listening(): Promise<void> {
  await holder.plumbrowListener?.established;
}
