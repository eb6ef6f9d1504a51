import { eq, lte, sql } from 'drizzle-orm';
import type { Database } from '../db/client.ts';
import { sessions } from '../db/schema/members.ts';
import type { Writing } from '../db/transact.ts';

/** A browser's session as it is kept. Times are milliseconds since 1970. */
export interface StoredSession {
  /** A hash of the cookie's value. */
  readonly id: string;
  readonly data: string;
  readonly memberId: string | null;
  readonly expiresAt: number;
}

/** Who is signed in where. */
export interface SessionStore {
  /** Null where there is none or it has expired. */
  get(id: string, now: number): StoredSession | null;
  put(session: StoredSession): void;
  extend(id: string, expiresAt: number): void;
  remove(id: string): void;
  removeAllOf(writing: Writing, memberId: string): void;
  /** Gives how many had expired. */
  prune(now: number): number;
}

/** Opens the sessions of a store. */
export function createSessionStore({ query }: Database): SessionStore {
  const byId = query
    .select()
    .from(sessions)
    .where(eq(sessions.id, sql.placeholder('id')))
    .prepare();
  return {
    get(id, now) {
      const row = byId.get({ id });
      return row === undefined || row.expiresAt <= now ? null : row;
    },
    put(session) {
      const { data, memberId, expiresAt } = session;
      query
        .insert(sessions)
        .values(session)
        .onConflictDoUpdate({ target: sessions.id, set: { data, memberId, expiresAt } })
        .run();
    },
    extend(id, expiresAt) {
      query.update(sessions).set({ expiresAt }).where(eq(sessions.id, id)).run();
    },
    remove(id) {
      query.delete(sessions).where(eq(sessions.id, id)).run();
    },
    removeAllOf({ database }, memberId) {
      database.query.delete(sessions).where(eq(sessions.memberId, memberId)).run();
    },
    prune(now) {
      return query.delete(sessions).where(lte(sessions.expiresAt, now)).run().changes;
    },
  };
}
