import type { Database } from './client.ts';

/** Tables whose rows are written once: a revision, what was decided and what was said stay as they were. */
export const immutableTables = [
  'revisions',
  'revision_bodies',
  'overrides',
  'proposal_versions',
  'proposal_notes',
  'audit',
] as const;

/**
 * Makes the triggers that refuse to change or delete a row of an immutable table. Done again after every migration,
 * because rebuilding a table drops its triggers without a word.
 */
export function guardImmutableTables(database: Database): void {
  for (const table of immutableTables) {
    for (const change of ['update', 'delete'] as const) {
      const trigger = `${table}_no_${change}`;
      database.sqlite.exec(`
        DROP TRIGGER IF EXISTS ${trigger};
        CREATE TRIGGER ${trigger} BEFORE ${change.toUpperCase()} ON ${table}
        BEGIN SELECT RAISE(ABORT, '${table} is never changed'); END;
      `);
    }
  }
}
