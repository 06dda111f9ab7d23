import { createHash } from 'node:crypto';
import { eq, lt } from 'drizzle-orm';
import { Store, type SessionData } from 'express-session';
import type { Database } from '../db/database.ts';
import { sessions } from '../db/schema.ts';

const DAY = 24 * 60 * 60 * 1000;

/** A session lives this long after it was last used. */
export const SESSION_MS = 30 * DAY;

/** The expiry is put off at most this often, so that reading does not write. */
const TOUCH_EVERY = DAY / 2;

const hash = (id: string): string => createHash('sha256').update(id).digest('hex');

type Done<T = void> = (error?: unknown, value?: T) => void;

/** Calls back the way express-session wants, whatever comes of it. */
function settle<T>(work: Promise<T>, done: Done<T> | undefined): void {
  work.then(
    (value) => done?.(null, value),
    (error: unknown) => done?.(error),
  );
}

/** Sessions in the database. Each row knows its person, so that all sessions of one can be ended. */
export class DatabaseSessions extends Store {
  readonly #database: Database;
  readonly #now: () => Date;
  readonly #touched = new Map<string, number>();

  constructor(database: Database, now: () => Date) {
    super();
    this.#database = database;
    this.#now = now;
  }

  override get(id: string, done: (error: unknown, session?: SessionData | null) => void): void {
    settle(this.#read(hash(id)), done as Done<SessionData | null>);
  }

  override set(id: string, session: SessionData, done?: Done): void {
    settle(this.#write(hash(id), session), done);
  }

  override destroy(id: string, done?: Done): void {
    settle(this.#end(hash(id)), done);
  }

  override touch(id: string, _session: SessionData, done?: Done): void {
    settle(this.#putOff(hash(id)), done);
  }

  async #read(idHash: string): Promise<SessionData | null> {
    const [row] = await this.#database.queries.select().from(sessions).where(eq(sessions.idHash, idHash));
    if (!row || row.expiresAt <= this.#now()) return null;
    return row.data as SessionData;
  }

  async #write(idHash: string, session: SessionData): Promise<void> {
    const userId = session.passport?.user ?? null;
    const row = { userId, data: session as unknown, expiresAt: this.#expiry() };
    await this.#database.queries
      .insert(sessions)
      .values({ idHash, ...row })
      .onConflictDoUpdate({ target: sessions.idHash, set: row });
    this.#touched.set(idHash, this.#now().getTime());
  }

  async #end(idHash: string): Promise<void> {
    this.#touched.delete(idHash);
    await this.#database.queries.delete(sessions).where(eq(sessions.idHash, idHash));
  }

  async #putOff(idHash: string): Promise<void> {
    const now = this.#now().getTime();
    if (now - (this.#touched.get(idHash) ?? 0) < TOUCH_EVERY) return;
    this.#touched.set(idHash, now);
    await this.#database.queries.update(sessions).set({ expiresAt: this.#expiry() }).where(eq(sessions.idHash, idHash));
  }

  #expiry(): Date {
    return new Date(this.#now().getTime() + SESSION_MS);
  }

  /** Deletes what nobody can use any more. */
  async sweep(): Promise<void> {
    const now = this.#now();
    for (const [idHash, at] of this.#touched) if (now.getTime() - at > SESSION_MS) this.#touched.delete(idHash);
    await this.#database.queries.delete(sessions).where(lt(sessions.expiresAt, now));
  }
}

declare module 'express-session' {
  interface SessionData {
    /** Written by passport. */
    passport?: { user?: string };
  }
}
