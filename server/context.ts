import { mkdirSync } from 'node:fs';
import { availableParallelism } from 'node:os';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';
import type { Logger } from 'pino';
import { requireSessionSecret } from './config/session-secret.ts';
import type { Settings } from './config/settings.ts';
import { openDatabase, type Database } from './db/client.ts';
import { migrate } from './db/migrate.ts';
import { randomId, type NewId } from './db/new-id.ts';
import { createLogger } from './http/logging.ts';
import type { Services } from './local-api.ts';
import { createMemberService } from './members/member-service.ts';
import { createSessionStore, type SessionStore } from './members/session-store.ts';
import { createBookEvents, type BookEvents } from './pages/book-events.ts';
import { createKeptPages, type KeptPages } from './pages/kept-pages.ts';
import { createPagePublication, type PagePublication } from './pages/page-publication.ts';
import { createPageService } from './pages/page-service.ts';
import type { ParsePool } from './pages/parse-pool-types.ts';
import { createParsePool } from './pages/parse-pool.ts';
import { refreshDerived } from './pages/refresh-derived.ts';
import { createProposalService } from './proposals/proposal-service.ts';
import { createSearchService } from './search/search-service.ts';

/** What a server is made from: its store and workers, and what stands for the clock and for chance. */
export interface ContextParts {
  readonly settings: Settings & { readonly sessionSecret: string };
  readonly database: Database;
  readonly parsePool: ParsePool;
  readonly logger: Logger;
  /** Milliseconds since 1970. */
  readonly now: () => number;
  readonly newId: NewId;
}

/** One running server, put together. */
export interface Context extends ContextParts {
  readonly services: Services;
  readonly publication: PagePublication;
  readonly events: BookEvents;
  readonly keptPages: KeptPages;
  readonly sessions: SessionStore;
  isStoreAnswering(): boolean;
  close(): Promise<void>;
}

const keptPagesBytes = 96 * 1024 * 1024;
const pruneMilliseconds = 3600 * 1000;

/** The one place that wires. */
export function createContext(parts: ContextParts): Context {
  const { settings, database, parsePool, logger, now, newId } = parts;
  const events = createBookEvents((failure, event) => {
    logger.error({ err: failure, event }, 'A listener did not take what was published');
  });
  const keptPages = createKeptPages(keptPagesBytes);
  // First of all listeners: whoever hears of a publication must not be answered with what stood there before.
  events.listen(() => keptPages.clear());

  const publication = createPagePublication(database, newId);
  const pages = createPageService({ database, parsePool, publication, reading: settings.reading });
  const proposals = createProposalService({
    database,
    parsePool,
    publication,
    events,
    now: () => new Date(now()),
    newId,
  });
  const members = createMemberService({ database, now, newId });
  const search = createSearchService({
    pages,
    events,
    reading: settings.reading,
    onFailure: (failure) => logger.error({ err: failure }, 'The search ended and is started again'),
  });
  const sessions = createSessionStore(database);

  sessions.prune(now());
  const pruning = setInterval(() => sessions.prune(now()), pruneMilliseconds);
  pruning.unref();

  return {
    ...parts,
    services: { members, pages, proposals, search },
    publication,
    events,
    keptPages,
    sessions,
    isStoreAnswering() {
      try {
        database.sqlite.prepare('SELECT 1').get();
        return true;
      } catch (error) {
        logger.error({ err: error }, 'The store does not answer');
        return false;
      }
    },
    async close() {
      clearInterval(pruning);
      await search.close();
      await parsePool.close();
      database.close();
    },
  };
}

/**
 * Opens the club's data, brings it up to date, and puts the server together.
 * @param folder the program's folder, with `drizzle/` in it
 */
export async function openContext(settings: Settings, folder: string): Promise<Context> {
  mkdirSync(settings.dataDir, { recursive: true });
  const sessionSecret = settings.sessionSecret ?? requireSessionSecret(settings.dataDir);
  const database = openDatabase(join(settings.dataDir, 'book.sqlite'));
  migrate(database, join(folder, 'drizzle'));
  const context = createContext({
    settings: { ...settings, sessionSecret },
    database,
    parsePool: createParsePool({
      workers: Math.max(1, Math.min(4, availableParallelism() - 1)),
      now: () => performance.now(),
    }),
    logger: createLogger(settings),
    now: Date.now,
    newId: randomId,
  });
  const unread = await refreshDerived(database, context.publication, context.parsePool);
  if (unread.length > 0) context.logger.warn({ unread }, 'These pages could not be read again and stay as they were');
  return context;
}
