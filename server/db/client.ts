import Sqlite from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import type { BetterSQLite3Database } from 'drizzle-orm/better-sqlite3';

/** How long a writer waits for another before it gives up. */
const busyTimeoutMilliseconds = 5000;

/** The open store: `query` for prepared queries, `sqlite` for what Drizzle has no word for. */
export interface Database {
  readonly sqlite: Sqlite.Database;
  readonly query: BetterSQLite3Database;
  close(): void;
}

/**
 * Opens the store, and makes it where there is none; its tables are `migrate`'s.
 * `synchronous` is set by hand, since write-ahead logging quietly runs NORMAL: what was acknowledged must survive a
 * power cut, and a club publishes rarely.
 * @param path a file's path
 */
export function openDatabase(path: string): Database {
  const sqlite = new Sqlite(path);
  sqlite.pragma('journal_mode = WAL');
  sqlite.pragma(`busy_timeout = ${busyTimeoutMilliseconds}`);
  sqlite.pragma('foreign_keys = ON');
  sqlite.pragma('synchronous = FULL');
  return { sqlite, query: drizzle(sqlite), close: () => sqlite.close() };
}
