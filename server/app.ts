import express, { type NextFunction, type Request, type Response } from 'express';
import type { RequestListener } from 'node:http';
import { isLoopback } from './config/settings.ts';
import type { Context } from './context.ts';
import { createApiRouter } from './http/api-router.ts';
import { createCrawlerRouter } from './http/crawlers.ts';
import { isCrossSite } from './http/cross-site.ts';
import { logRequests } from './http/logging.ts';
import { nothingHere, notFromHere, problemOf, sendProblem, unexpected } from './http/problems.ts';
import { isReading } from './http/representation.ts';
import { createSecurityHeaders, readHeaders } from './http/security-headers.ts';
import { createSessions, sessionCookieName } from './http/sessions.ts';
import { createSignIn } from './http/sign-in.ts';
import type { Site } from './http/ssr-site.ts';
import { createPages } from './http/ssr.ts';
import { createStaticFiles } from './http/static-files.ts';
import { createVisitorPages } from './http/visitor-pages.ts';
import { createSearchFileRouter } from './search/search-file-routes.ts';

export interface AppParts {
  readonly site: Site;
  /** `dist/client`; null in development, where the site serves its files itself. */
  readonly clientFolder: string | null;
}

/**
 * The club's site over HTTP: kept pages and built files are answered at once, from memory; everything else goes through
 * Express.
 */
export function createApp(context: Context, { site, clientFolder }: AppParts): RequestListener {
  const { settings, services, events, keptPages, sessions, logger, now } = context;
  const { baseUrl, reading } = settings;
  const security = createSecurityHeaders(baseUrl, site.nonce);
  const securityHeaders = readHeaders(createSecurityHeaders(baseUrl, null));
  const cookie = { name: sessionCookieName(baseUrl), secure: baseUrl.protocol === 'https:' };
  const signIn = createSignIn(services.members, cookie);
  const visitorPages =
    reading === 'open' && site.nonce === null ? createVisitorPages(keptPages, cookie.name, securityHeaders) : null;
  const files = clientFolder === null ? null : createStaticFiles(clientFolder, securityHeaders);
  const pages = createPages({ site, services, signIn, baseUrl, reading, visitorPages });

  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  // Only where the site is reached by another name does a server stand in front that may say whose request it is.
  app.set('trust proxy', isLoopback(baseUrl) ? false : 'loopback');
  app.use(logRequests(logger));
  app.use(security);
  app.use(async (request, response, next) => {
    if (!isCrossSite(request, baseUrl)) next();
    else if (isApi(request)) sendProblem(response, notFromHere);
    else await pages.refuse(request, response, notFromHere);
  });
  app.get('/healthz', (_, response) => {
    const answers = context.isStoreAnswering();
    response.setHeader('Cache-Control', 'no-store');
    response.status(answers ? 200 : 503).json({ status: answers ? 'ok' : 'the store does not answer' });
  });
  app.use(createCrawlerRouter({ pages: services.pages, events, baseUrl, reading }));
  if (site.middleware !== null) app.use(site.middleware);
  app.use(createSessions(sessions, baseUrl, settings.sessionSecret, now));
  app.use(signIn.middleware);
  app.use(createSearchFileRouter({ search: services.search, signIn, reading }));
  app.use(createApiRouter({ services, signIn, reading }));
  app.use(pages.handler);
  app.use(async (error: unknown, request: Request, response: Response, next: NextFunction) => {
    if (response.headersSent) return next(error);
    const refusal = problemOf(error);
    if (refusal === null) request.log.error({ err: error }, 'A request could not be answered');
    if (isApi(request)) sendProblem(response, refusal ?? unexpected(request));
    else await pages.refuse(request, response, refusal === null ? unexpected(request) : nothingHere);
  });

  return (request, response) => {
    if (isReading(request)) {
      if (visitorPages?.send(request, response) === true) return;
      if (files?.send(request, response) === true) return;
    }
    app(request, response);
  };
}

function isApi({ path }: Request): boolean {
  return path === '/api' || path.startsWith('/api/');
}
