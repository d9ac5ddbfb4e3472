import type { Logger } from 'pino';
import pg from 'pg';
import type { SheetChanged } from '@second-spanner/shared/contracts/sheets';
import { isId } from '../validation/parse-id.js';

/** Somebody who looks at a sheet. */
export interface SheetListener {
  changed(change: SheetChanged): void;
  /** Something may have been missed: read the sheet again. */
  interrupted(): void;
}

const channel = 'sheet_changed';
const pauseMs = 1_000;

/**
 * Tells every api process about changes of sheets, over one connection of its own. A change is announced
 * after its transaction: a NOTIFY inside would make all writers wait for one another at commit.
 */
export class SheetEvents {
  private readonly listeners = new Map<string, Set<SheetListener>>();
  /** Latest version of each sheet that is still to be told. */
  private readonly outbox = new Map<string, number>();
  /** The connection at hand, or the one being made. */
  private client: pg.Client | null = null;
  private listening = false;
  private sending = false;
  private stopped = false;
  private retry: NodeJS.Timeout | undefined;

  constructor(
    private readonly databaseUrl: string,
    private readonly log: Logger,
  ) {}

  /** Begins to listen; connects again by itself whenever the connection is lost. */
  async start(): Promise<void> {
    const client = new pg.Client({
      connectionString: this.databaseUrl,
      application_name: 'second-spanner-events',
      connectionTimeoutMillis: 5_000,
      keepAlive: true,
    });
    this.client = client;
    client.on('error', (error) => {
      this.lost(client, error);
    });
    client.on('end', () => {
      this.lost(client, null);
    });
    client.on('notification', ({ payload }) => {
      this.received(payload ?? '');
    });
    try {
      await client.connect();
      // A lost notice is made up for by `interrupted`, so none of them waits for the disk.
      await client.query(`SET synchronous_commit = off; LISTEN ${channel}`);
    } catch (error) {
      this.lost(client, error);
      await client.end().catch(() => undefined);
      return;
    }
    this.listening = true;
    this.send();
  }

  async stop(): Promise<void> {
    this.stopped = true;
    clearTimeout(this.retry);
    const { client } = this;
    this.client = null;
    for (const listener of this.all()) listener.interrupted();
    await client?.end().catch(() => undefined);
  }

  /** Calls the listener for every change of the sheet until the returned function is called. */
  subscribe(sheetId: string, listener: SheetListener): () => void {
    const ofSheet = this.listeners.get(sheetId) ?? new Set();
    this.listeners.set(sheetId, ofSheet.add(listener));
    return () => {
      ofSheet.delete(listener);
      if (ofSheet.size === 0 && this.listeners.get(sheetId) === ofSheet) this.listeners.delete(sheetId);
    };
  }

  /** Tells all api processes. Changes that come while one is being sent go together. */
  publish(changes: readonly SheetChanged[]): void {
    for (const { sheetId, version } of changes) this.outbox.set(sheetId, version);
    this.send();
  }

  private send(): void {
    if (this.sending || this.outbox.size === 0 || !this.listening || !this.client) return;
    const payloads = [...this.outbox].map(([sheetId, version]) => `${sheetId} ${version}`);
    this.outbox.clear();
    this.sending = true;
    this.client
      .query(`SELECT pg_notify('${channel}', payload) FROM unnest($1::text[]) AS payload`, [payloads])
      .catch((error: unknown) => {
        this.log.warn({ err: error }, 'Changes of sheets could not be announced.');
      })
      .finally(() => {
        this.sending = false;
        this.send();
      });
  }

  private received(payload: string): void {
    const [sheetId, version] = payload.split(' ', 2);
    if (!isId(sheetId)) return;
    for (const listener of this.listeners.get(sheetId) ?? []) {
      listener.changed({ sheetId, version: Number(version) });
    }
  }

  private lost(client: pg.Client, error: unknown): void {
    if (this.stopped || this.client !== client) return;
    this.client = null;
    this.listening = false;
    if (error !== null) this.log.warn({ err: error }, 'The connection for live events was lost.');
    for (const listener of this.all()) listener.interrupted();
    clearTimeout(this.retry);
    this.retry = setTimeout(() => void this.start(), pauseMs);
  }

  private all(): SheetListener[] {
    return [...this.listeners.values()].flatMap((listeners) => [...listeners]);
  }
}
