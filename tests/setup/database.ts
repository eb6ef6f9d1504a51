import { createHash } from 'node:crypto';
import {
  copyFileSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { onTestFinished } from 'vitest';
import { openDatabase, type Database } from '../../server/db/client.ts';
import { migrate } from '../../server/db/migrate.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** The folder of the generated migrations. */
export const migrationsFolder = join(root, 'drizzle');

function filesOf(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => /\.(sql|json)$/.test(file))
    .sort();
}

/** A store that was migrated once, for every test to copy; made anew when a migration or what follows one changes. */
function baseFile(): string {
  const hash = createHash('sha256');
  for (const file of filesOf(migrationsFolder)) hash.update(readFileSync(join(migrationsFolder, file)));
  for (const file of ['client.ts', 'migrate.ts', 'immutability.ts']) {
    hash.update(readFileSync(join(root, 'server/db', file)));
  }
  const folder = join(root, '.cache', 'test-stores');
  const file = join(folder, `${hash.digest('hex').slice(0, 16)}.sqlite`);
  if (existsSync(file)) return file;
  mkdirSync(folder, { recursive: true });
  // Test files run side by side: each may make it, and the last one's takes its place whole.
  const own = join(mkdtempSync(join(folder, 'new-')), 'base.sqlite');
  const database = openDatabase(own);
  migrate(database, migrationsFolder);
  database.sqlite.pragma('wal_checkpoint(TRUNCATE)');
  database.close();
  renameSync(own, file);
  rmSync(join(own, '..'), { recursive: true, force: true });
  return file;
}

/** A folder that is gone when the test is over. */
export function temporaryFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), 'earthstrap-test-'));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

/** An empty, migrated store of the test's own, in a real file. */
export function openTestDatabase(): Database {
  const file = join(temporaryFolder(), 'book.sqlite');
  copyFileSync(baseFile(), file);
  const database = openDatabase(file);
  onTestFinished(() => database.close());
  return database;
}
