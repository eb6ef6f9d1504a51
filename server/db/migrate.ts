import { migrate as runMigrations } from 'drizzle-orm/better-sqlite3/migrator';
import type { Database } from './client.ts';
import { guardImmutableTables } from './immutability.ts';

/**
 * Brings the store's tables up to date.
 * Foreign keys are off meanwhile: a rebuilt table's `PRAGMA foreign_keys=OFF` does nothing inside the migrator's
 * transaction, and its `DROP TABLE` would then fire every `ON DELETE`. Afterwards all of them are checked.
 * @param migrationsFolder the folder `drizzle/`
 * @throws where a row points at nothing after the migration
 */
export function migrate(database: Database, migrationsFolder: string): void {
  database.sqlite.pragma('foreign_keys = OFF');
  try {
    runMigrations(database.query, { migrationsFolder });
    const violations = database.sqlite.pragma('foreign_key_check');
    if (!Array.isArray(violations) || violations.length > 0) {
      throw new Error(`After the migration some rows point at nothing: ${JSON.stringify(violations)}`);
    }
    guardImmutableTables(database);
  } finally {
    database.sqlite.pragma('foreign_keys = ON');
  }
}
