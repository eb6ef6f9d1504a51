import { createServer } from 'node:http';
import { onTestFinished } from 'vitest';
import { createApp } from '../../server/app.ts';
import { readSettings } from '../../server/config/settings.ts';
import { createContext, type Context } from '../../server/context.ts';
import { members } from '../../server/db/schema/members.ts';
import { createLogger } from '../../server/http/logging.ts';
import type { Site } from '../../server/http/ssr-site.ts';
import { hashPassword } from '../../server/members/passwords.ts';
import type { Member } from '../../shared/members/member.ts';
import { pageText, connectorBlock, overviewText } from './page-texts.ts';
import { accepted, testbike } from './book.ts';
import { addMember } from './members.ts';
import { createDirectParsePool } from './parse-pool.ts';
import { createPlainSite } from './plain-site.ts';
import { openTestDatabase, temporaryFolder } from '../setup/database.ts';

/** What every member of a test's club has as their password. */
export const testPassword = 'a password of the test';
const passwordHash = hashPassword(testPassword);

/** Asks the club's server as one browser does: it says where a form came from, keeps cookies, follows no redirect. */
export type Browser = (path: string, init?: RequestInit) => Promise<Response>;

export interface HttpClubOptions {
  readonly environment?: Readonly<Record<string, string>>;
  readonly site?: Site;
  readonly clientFolder?: string;
}

export interface HttpClub {
  readonly origin: string;
  readonly context: Context;
  readonly people: Readonly<Record<'hobbyist' | 'writer' | 'moderator' | 'admin', Member>>;
  /** The clock goes on only when the test says so. */
  wait(milliseconds: number): void;
  /** A browser that nobody has signed in with. */
  openBrowser(): Browser;
  /** A browser in which this person has signed in. */
  signedIn(person: Member): Promise<Browser>;
}

/** A club's server on a port of its own, with a store of its own in which a donor's pages are published. */
export async function openHttpClub(options: HttpClubOptions = {}): Promise<HttpClub> {
  const database = openTestDatabase();
  const people = {
    hobbyist: addMember(database, 'Hobbyist'),
    writer: addMember(database, 'Writer'),
    moderator: addMember(database, 'Moderator', 'moderator'),
    admin: addMember(database, 'Admin', 'admin'),
  };
  database.query
    .update(members)
    .set({ passwordHash: await passwordHash })
    .run();

  const server = createServer();
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('the server has no port');
  const origin = `http://127.0.0.1:${String(address.port)}`;
  const settings = readSettings(
    { BASE_URL: origin, LOG_LEVEL: 'silent', SEED: 'none', ...options.environment },
    temporaryFolder(),
  );

  let now = Date.UTC(2026, 0, 1, 12);
  let ids = 0;
  const context = createContext({
    settings: { ...settings, sessionSecret: 'a secret of the test, long enough' },
    database,
    parsePool: createDirectParsePool(),
    logger: createLogger(settings),
    now: () => now,
    newId: () => `id-${String((ids += 1)).padStart(4, '0')}`,
  });
  const { proposals } = context.services;
  for (const [page, markdown] of [
    [testbike.overview, overviewText()],
    [testbike.pinouts, pageText({ body: connectorBlock() })],
  ] as const) {
    const draft = accepted(
      await proposals.propose(people.writer, { ...page, baseRevision: null, markdown, summary: 'Written.' }),
    );
    accepted(await proposals.send(people.writer, draft.id));
    accepted(await proposals.publish(people.moderator, draft.id, {}));
  }
  server.on(
    'request',
    createApp(context, { site: options.site ?? createPlainSite(), clientFolder: options.clientFolder ?? null }),
  );
  onTestFinished(async () => {
    server.closeAllConnections();
    await new Promise((resolve) => server.close(resolve));
    await context.close();
  });

  function openBrowser(): Browser {
    const cookies = new Map<string, string>();
    return async (path, init = {}) => {
      const headers = new Headers(init.headers);
      const kept = [...cookies].map(([name, value]) => `${name}=${value}`);
      if (kept.length > 0 && !headers.has('cookie')) headers.set('cookie', kept.join('; '));
      if (!headers.has('origin')) headers.set('origin', origin);
      const response = await fetch(`${origin}${path}`, { redirect: 'manual', ...init, headers });
      for (const cookie of response.headers.getSetCookie()) {
        const [, name = '', value = ''] = /^([^=]+)=([^;]*)/.exec(cookie) ?? [];
        if (/expires=Thu, 01 Jan 1970/i.test(cookie)) cookies.delete(name);
        else cookies.set(name, value);
      }
      return response;
    };
  }

  return {
    origin,
    context,
    people,
    wait(milliseconds) {
      now += milliseconds;
    },
    openBrowser,
    async signedIn(person) {
      const browser = openBrowser();
      const response = await browser('/api/session', sendJson('POST', { email: person.email, password: testPassword }));
      if (!response.ok) throw new Error(`${person.name} could not sign in: ${await response.text()}`);
      return browser;
    },
  };
}

/** A request with a JSON body. */
export function sendJson(method: string, body: unknown, headers: Readonly<Record<string, string>> = {}): RequestInit {
  return { method, body: JSON.stringify(body), headers: { 'content-type': 'application/json', ...headers } };
}
