import { isAbsolute, resolve } from 'node:path';
import { z } from 'zod';

/** Where the club's server listens, what it keeps where, and who may read. */
export interface Settings {
  readonly port: number;
  readonly host: string;
  /** An absolute path: database and session secret. */
  readonly dataDir: string;
  /** The origin by which people reach the site, without a path. */
  readonly baseUrl: URL;
  /** Null: one is made and kept in the data folder. */
  readonly sessionSecret: string | null;
  readonly reading: 'open' | 'members';
  /** What an empty store is filled with. */
  readonly seed: 'demo' | 'none';
  readonly logLevel: (typeof logLevels)[number];
}

const logLevels = ['silent', 'error', 'warn', 'info', 'debug'] as const;

const port = z.coerce
  .number<string>('write a number from 0 to 65535')
  .int('write a number from 0 to 65535')
  .min(0, 'write a number from 0 to 65535')
  .max(65_535, 'write a number from 0 to 65535');

const siteOrigin = z
  .url({ protocol: /^https?$/, error: 'write an address such as https://book.example' })
  .transform((text) => new URL(text))
  .refine((url) => url.pathname === '/' && url.search === '', 'write the address without a path');

const environmentSchema = z.object({
  PORT: port.default(3000),
  HOST: z.string().default('127.0.0.1'),
  DATA_DIR: z.string().default('data'),
  BASE_URL: siteOrigin.optional(),
  SESSION_SECRET: z.string().min(32, 'write at least 32 characters that nobody can guess').optional(),
  READING: z.enum(['open', 'members'], 'write open or members').default('open'),
  SEED: z.enum(['demo', 'none'], 'write demo or none').optional(),
  LOG_LEVEL: z.enum(logLevels, `write one of ${logLevels.join(', ')}`).default('warn'),
});

/** Thrown where a setting cannot be read; its message is for whoever starts the server. */
export class SettingsError extends Error {
  override readonly name = 'SettingsError';
}

/**
 * Reads the settings from the environment, with defaults that run. An empty variable counts as absent.
 * @param environment `process.env`
 * @param folder what a relative `DATA_DIR` stands in
 * @throws SettingsError that names each variable that cannot be read
 */
export function readSettings(environment: Readonly<Record<string, string | undefined>>, folder: string): Settings {
  const written = Object.fromEntries(Object.entries(environment).filter(([, value]) => value?.trim() !== ''));
  const read = environmentSchema.safeParse(written);
  if (!read.success) {
    const lines = read.error.issues.map((issue) => `${issue.path.map(String).join('.')}: ${issue.message}.`);
    throw new SettingsError(lines.join('\n'));
  }
  const { PORT, HOST, DATA_DIR, BASE_URL, SESSION_SECRET, READING, SEED, LOG_LEVEL } = read.data;
  const baseUrl = BASE_URL ?? new URL(`http://${HOST.includes(':') ? `[${HOST}]` : HOST}:${PORT}`);
  return {
    port: PORT,
    host: HOST,
    dataDir: isAbsolute(DATA_DIR) ? DATA_DIR : resolve(folder, DATA_DIR),
    baseUrl,
    sessionSecret: SESSION_SECRET ?? null,
    reading: READING,
    // The demo's passwords are public: only a book that nobody else reaches is filled with it unasked.
    seed: SEED ?? (isLoopback(baseUrl) ? 'demo' : 'none'),
    logLevel: LOG_LEVEL,
  };
}

/** True where an address leads to this machine alone. */
export function isLoopback({ hostname }: URL): boolean {
  return /^(localhost|.*\.localhost|127(\.\d+){3}|\[::1\])$/.test(hostname);
}
