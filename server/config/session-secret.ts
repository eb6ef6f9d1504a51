import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * The secret that session cookies are signed with: made at the first start and kept, so that a restart signs nobody out.
 * @param dataDir a folder that exists
 */
export function requireSessionSecret(dataDir: string): string {
  const file = join(dataDir, 'session-secret');
  if (existsSync(file)) return readFileSync(file, 'utf8').trim();
  const secret = randomBytes(32).toString('base64url');
  // `wx`: where two servers start at once, the second fails rather than signing with another secret.
  writeFileSync(file, `${secret}\n`, { mode: 0o600, flag: 'wx' });
  return secret;
}
