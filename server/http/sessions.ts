import { createHash } from 'node:crypto';
import session, { Store, type SessionData } from 'express-session';
import type { RequestHandler } from 'express';
import { z } from 'zod';
import type { SessionStore } from '../members/session-store.ts';

const sessionMilliseconds = 30 * 24 * 3600 * 1000;

/** A session that rolls on is written again only after so long, or every page that a member reads would cost a write. */
const leastExtension = 3600 * 1000;

const signedIn = z.object({ passport: z.object({ user: z.string() }) });

/** The cookie's name. With TLS the browser itself keeps it from other paths and subdomains, by its prefix. */
export function sessionCookieName(baseUrl: URL): string {
  return baseUrl.protocol === 'https:' ? '__Host-earthstrap' : 'earthstrap';
}

/** What whoever signs out has their browser forget. */
export const sessionCookie = { path: '/', httpOnly: true, sameSite: 'lax' } as const;

/** Sessions of browsers: thirty days rolling, on our own store. Visitors have none. */
export function createSessions(store: SessionStore, baseUrl: URL, secret: string, now: () => number): RequestHandler {
  const secure = baseUrl.protocol === 'https:';
  const sessions = session({
    name: sessionCookieName(baseUrl),
    secret,
    store: new SqliteSessions(store, now),
    cookie: { ...sessionCookie, secure, maxAge: sessionMilliseconds },
    rolling: true,
    resave: false,
    saveUninitialized: false,
    proxy: secure,
  });
  return (request, response, next) => {
    // Whoever is told that the site is reached by TLS stands in front of us, and need not say so with each request.
    if (secure) request.headers['x-forwarded-proto'] = 'https';
    sessions(request, response, next);
  };
}

/** express-session's view of our store. Cookie values are hashed: a copy of the store signs nobody in. */
class SqliteSessions extends Store {
  readonly #store: SessionStore;
  readonly #now: () => number;

  constructor(store: SessionStore, now: () => number) {
    super();
    this.#store = store;
    this.#now = now;
  }

  override get(sessionId: string, callback: (error: unknown, data?: SessionData | null) => void): void {
    settle(callback, () => {
      const stored = this.#store.get(hashOf(sessionId), this.#now());
      // What `set` below wrote; nobody else writes there.
      return stored === null ? null : JSON.parse(stored.data);
    });
  }

  override set(sessionId: string, data: SessionData, callback: (error?: unknown) => void): void {
    settle(callback, () => {
      const read = signedIn.safeParse(data);
      this.#store.put({
        id: hashOf(sessionId),
        data: JSON.stringify(data),
        memberId: read.success ? read.data.passport.user : null,
        expiresAt: this.#now() + sessionMilliseconds,
      });
    });
  }

  override touch(sessionId: string, _data: SessionData, callback: (error?: unknown) => void): void {
    settle(callback, () => {
      const id = hashOf(sessionId);
      const expiresAt = this.#now() + sessionMilliseconds;
      const stored = this.#store.get(id, this.#now());
      if (stored !== null && expiresAt - stored.expiresAt >= leastExtension) this.#store.extend(id, expiresAt);
    });
  }

  override destroy(sessionId: string, callback: (error?: unknown) => void): void {
    settle(callback, () => this.#store.remove(hashOf(sessionId)));
  }
}

function settle<Value>(callback: ((error: unknown, value?: Value) => void) | undefined, act: () => Value): void {
  let value: Value;
  try {
    value = act();
  } catch (error) {
    callback?.(error);
    return;
  }
  callback?.(null, value);
}

function hashOf(sessionId: string): string {
  return createHash('sha256').update(sessionId).digest('base64url');
}
