import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { createAuditLog } from '../../../server/db/audit-log.ts';
import { openDatabase, type Database } from '../../../server/db/client.ts';
import { immutableTables } from '../../../server/db/immutability.ts';
import { migrate } from '../../../server/db/migrate.ts';
import { transact } from '../../../server/db/transact.ts';
import { migrationsFolder, openTestDatabase, temporaryFolder } from '../../setup/database.ts';
import { addMember } from '../../factories/members.ts';

describe('the open store', () => {
  it('is one that survives a power cut and keeps its references', () => {
    const { sqlite } = openTestDatabase();
    const settings = ['journal_mode', 'synchronous', 'foreign_keys', 'busy_timeout'] as const;
    expect(settings.map((name) => sqlite.pragma(name, { simple: true }))).toEqual(['wal', 2, 1, 5000]);
  });

  it('writes all of a transaction or nothing', () => {
    const database = openTestDatabase();
    const write = (): void =>
      transact(database, () => {
        addMember(database, 'Writer');
        throw new Error('half way');
      });
    expect(write).toThrow('half way');
    expect(database.sqlite.prepare('SELECT count(*) AS members FROM members').get()).toEqual({ members: 0 });
  });

  it('refuses a transaction that would go on after it was committed', () => {
    const database = openTestDatabase();
    const write = () =>
      transact(database, async () => {
        addMember(database, 'Writer');
        await Promise.resolve();
      });
    expect(write).toThrow('promise');
    expect(database.sqlite.prepare('SELECT count(*) AS members FROM members').get()).toEqual({ members: 0 });
  });
});

/** Writes one row into every immutable table. */
function fill({ sqlite }: Database): void {
  sqlite.exec(`
    INSERT INTO members VALUES ('m', 'm@earthstrap.example', 'M', 'member', 'none', NULL, '2026');
    INSERT INTO subjects VALUES ('s', 'donors', 'd', 'D', 1, '2026');
    INSERT INTO pages VALUES ('p', 's', 'overview', 'D', 'overview', '', 1, '2026', NULL, '2026');
    INSERT INTO revisions VALUES ('r', 'p', 1, 'D', 'First', 'm', 'm', '2026', 'q', 'hash');
    INSERT INTO revision_bodies VALUES ('r', 'text');
    INSERT INTO overrides VALUES ('o', 'r', 'id-repeated', NULL, 'because', 'm', '2026');
    INSERT INTO proposals VALUES ('q', 'donors', 'd', 'overview', 'm', 'published', 'D', 'First', NULL, 0, 1, '2026', '2026', '2026', 'm', 'r');
    INSERT INTO proposal_versions VALUES ('q', 1, 'text', 'First', NULL, '2026', '2026');
    INSERT INTO proposal_notes VALUES ('n', 'q', 1, 'm', 'note', 'Good.', NULL, NULL, '2026');
    INSERT INTO audit VALUES (1, '2026', 'm', 'publish', 'q', '{}', '', 'hash');
  `);
}

function expectImmutable({ sqlite }: Database): void {
  for (const table of immutableTables) {
    const before = sqlite.prepare(`SELECT * FROM ${table}`).all();
    expect(before, table).toHaveLength(1);
    const [column] = Object.keys(before[0] ?? {});
    expect(() => sqlite.exec(`UPDATE ${table} SET ${column} = ${column}`), table).toThrow('never changed');
    expect(() => sqlite.exec(`DELETE FROM ${table}`), table).toThrow('never changed');
    expect(sqlite.prepare(`SELECT * FROM ${table}`).all(), table).toEqual(before);
  }
}

describe('what was decided', () => {
  it('can be neither changed nor deleted in the store', () => {
    const database = openTestDatabase();
    fill(database);
    expectImmutable(database);
  });

  it('still cannot, and has lost nothing, after a migration that rebuilds its table and one that others point at', () => {
    const database = openTestDatabase();
    fill(database);
    // Pointers that a DROP TABLE would fire, as a rebuild does where foreign keys are on.
    database.sqlite
      .exec(`CREATE TABLE marks (id text PRIMARY KEY, member_id text REFERENCES members(id) ON DELETE SET NULL);
      INSERT INTO marks VALUES ('k', 'm');`);
    migrate(database, rebuildingMigrations());
    expectImmutable(database);
    expect(database.sqlite.prepare('SELECT member_id FROM marks').all()).toEqual([{ member_id: 'm' }]);
    expect(database.sqlite.pragma('foreign_keys', { simple: true })).toBe(1);
  });

  it('is not opened after a migration that leaves a row pointing at nothing', () => {
    const database = openTestDatabase();
    fill(database);
    const orphan = "INSERT INTO `revision_bodies` VALUES ('nowhere', 'text');";
    expect(() => migrate(database, laterMigrations(orphan))).toThrow('point at nothing');
  });
});

/** Migrations that rebuild tables the way drizzle-kit writes it. */
function rebuildingMigrations(): string {
  const rebuild = (table: string, columns: string): string => `PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE \`__new_${table}\` (${columns});--> statement-breakpoint
INSERT INTO \`__new_${table}\` SELECT * FROM \`${table}\`;--> statement-breakpoint
DROP TABLE \`${table}\`;--> statement-breakpoint
ALTER TABLE \`__new_${table}\` RENAME TO \`${table}\`;--> statement-breakpoint
PRAGMA foreign_keys=ON;`;
  return laterMigrations(
    [
      rebuild(
        'members',
        'id text PRIMARY KEY, email text UNIQUE, name text, role text, password_hash text, suspended_at text, created_at text',
      ),
      rebuild('revision_bodies', 'revision_id text PRIMARY KEY REFERENCES revisions(id), markdown text'),
    ].join('--> statement-breakpoint\n'),
  );
}

/** A folder of migrations in which only this one is newer than those that the test's store has had. */
function laterMigrations(sql: string): string {
  const folder = temporaryFolder();
  mkdirSync(join(folder, 'meta'));
  const entries = [{ idx: 0, version: '6', when: Date.UTC(2100, 0, 1), tag: '9999_later', breakpoints: true }];
  writeFileSync(join(folder, 'meta', '_journal.json'), JSON.stringify({ version: '7', dialect: 'sqlite', entries }));
  writeFileSync(join(folder, '9999_later.sql'), sql);
  return folder;
}

describe('migrating', () => {
  it('makes an empty file the same store that copies start from, and does nothing the second time', () => {
    const schemaOf = ({ sqlite }: Database): unknown[] =>
      sqlite.prepare("SELECT type, name, sql FROM sqlite_master WHERE name NOT LIKE 'sqlite_%' ORDER BY name").all();
    const database = openDatabase(join(temporaryFolder(), 'new.sqlite'));
    migrate(database, migrationsFolder);
    const once = schemaOf(database);
    migrate(database, migrationsFolder);
    expect(schemaOf(database)).toEqual(once);
    expect(once).toEqual(schemaOf(openTestDatabase()));
    database.close();
  });
});

describe('the audit', () => {
  it('is a chain in which a changed row and a missing row show', () => {
    const database = openTestDatabase();
    const { id: actorId } = addMember(database, 'Admin', 'admin');
    const audit = createAuditLog(database);
    for (const subject of ['one', 'two', 'three']) {
      transact(database, (writing) =>
        audit.append(writing, {
          at: '2026-01-01T00:00:00.000Z',
          actorId,
          action: 'publish',
          subject,
          details: { subject },
        }),
      );
    }
    expect(audit.firstBrokenLink()).toBeNull();
    database.sqlite.exec("DROP TRIGGER audit_no_update; UPDATE audit SET subject = 'other' WHERE number = 2");
    expect(audit.firstBrokenLink()).toBe(2);
    database.sqlite.exec("UPDATE audit SET subject = 'two' WHERE number = 2");
    expect(audit.firstBrokenLink()).toBeNull();
    database.sqlite.exec('DROP TRIGGER audit_no_delete; DELETE FROM audit WHERE number = 2');
    expect(audit.firstBrokenLink()).toBe(3);
  });
});
