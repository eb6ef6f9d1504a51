import { hash, verify } from '@node-rs/argon2';

/**
 * OWASP's Password Storage Cheat Sheet gives these as the least for Argon2id: 19 MiB, two passes, one lane.
 * Argon2id is what the package makes when it is not told otherwise.
 * https://cheatsheetseries.owasp.org/cheatsheets/Password_Storage_Cheat_Sheet.html
 */
const costs = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** An Argon2id hash of a password, with its own salt and costs in it. */
export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFKC'), costs);
}

/** True where the password is the one that was hashed. */
export function verifyPassword(passwordHash: string, password: string): Promise<boolean> {
  return verify(passwordHash, password.normalize('NFKC'));
}
