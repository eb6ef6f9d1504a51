import { createHeaders } from '@remix-run/node-fetch-server';
import type { Request as ExpressRequest, RequestHandler, Response as ExpressResponse } from 'express';
import type { Problem } from '../../shared/lib/problem.ts';
import { createLocalApi, type Door, type Services } from '../local-api.ts';
import { readBenchCookies } from './bench-cookies.ts';
import { nothingHere, putProblemHeaders, tooLong, unexpected, wrongMethod } from './problems.ts';
import { readForm } from './read-form.ts';
import { isReading, noCache, privateCache, publicCache, sendRepresentation } from './representation.ts';
import type { SignIn } from './sign-in.ts';
import type { Site } from './ssr-site.ts';
import { fillTemplate, refusalPage } from './template.ts';
import type { VisitorPages } from './visitor-pages.ts';

/** The site's pages over HTTP. */
export interface Pages {
  readonly handler: RequestHandler;
  /** Says with a page why something was refused before it reached the site. */
  refuse(request: ExpressRequest, response: ExpressResponse, refusal: Problem): Promise<void>;
}

export interface PagesParts {
  readonly site: Site;
  readonly services: Services;
  readonly signIn: SignIn;
  readonly baseUrl: URL;
  readonly reading: 'open' | 'members';
  /** Null where nothing may be kept: in development, and where reading is for members. */
  readonly visitorPages: VisitorPages | null;
}

/** A request for a page, as far as it is understood. */
interface Visit {
  readonly request: ExpressRequest;
  readonly response: ExpressResponse;
  readonly door: Door;
  readonly address: URL;
  readonly form: Uint8Array<ArrayBuffer> | null;
}

const methods: readonly string[] = ['GET', 'HEAD', 'POST'];
/** What a visitor may see of a club that keeps its reading to members. */
const openPaths: readonly string[] = ['/sign-in'];
const html = 'text/html; charset=utf-8';

/** The one edge from the server to the site: a request goes in as the web's own `Request`, a page comes out. */
export function createPages({ site, services, signIn, baseUrl, reading, visitorPages }: PagesParts): Pages {
  async function refuse(request: ExpressRequest, response: ExpressResponse, refusal: Problem): Promise<void> {
    putProblemHeaders(response, refusal);
    const template = await site.template(request.originalUrl, response);
    const text = refusalPage(template, refusal);
    await sendRepresentation(request, response, {
      status: refusal.status,
      contentType: html,
      text,
      cacheControl: noCache,
    });
  }

  async function answer(request: ExpressRequest, response: ExpressResponse): Promise<void> {
    if (!methods.includes(request.method)) {
      response.setHeader('Allow', methods.join(', '));
      return refuse(request, response, wrongMethod(request.method, methods));
    }
    // An address such as `//elsewhere/` would be taken for another site's.
    if (!request.originalUrl.startsWith('/') || request.originalUrl.startsWith('//')) {
      return refuse(request, response, nothingHere);
    }
    const door = signIn.doorOf(request, response);
    const address = new URL(request.originalUrl, baseUrl);
    if (reading === 'members' && door.actor === null && isReading(request) && !openPaths.includes(address.pathname)) {
      response.setHeader('Cache-Control', noCache);
      response.redirect(302, `/sign-in?next=${encodeURIComponent(request.originalUrl)}`);
      return;
    }
    const form = isReading(request) ? null : await readForm(request);
    if (form === null && !isReading(request)) return refuse(request, response, tooLong);

    const visit = { request, response, door, address, form };
    const key = door.actor === null ? (visitorPages?.keyOf(request) ?? null) : null;
    if (visitorPages === null || key === null) return renderPage(visit, null);
    const underWay = visitorPages.underWay(key);
    if (underWay !== null) {
      // Many ask at once for a page that was just published: one rendering serves them all.
      await underWay;
      if (visitorPages.send(request, response)) return;
    }
    const end = visitorPages.begin(key);
    try {
      await renderPage(visit, key);
    } finally {
      end();
    }
  }

  /** Has the site make the page; kept under the key, where it has one. */
  async function renderPage({ request, response, door, address, form }: Visit, key: string | null): Promise<void> {
    // Before anything is read: what is published while the page is made must not be hidden by it.
    const generation = visitorPages?.generation() ?? 0;
    const faults: unknown[] = [];
    const rendered = await site.render(
      new Request(address, { method: request.method, headers: createHeaders(request), body: form }),
      {
        api: createLocalApi(services, door),
        ...readBenchCookies(request.headers.cookie),
        onError: (error) => faults.push(error),
      },
    );
    for (const fault of faults) request.log.error({ err: fault }, 'A page could not be made');

    if (rendered.kind === 'response') return sendFetched(response, rendered.response);
    putHeaders(response, rendered.headers);
    const text = fillTemplate(await site.template(request.originalUrl, response), rendered);
    if (visitorPages !== null && key !== null && rendered.keepable) {
      await visitorPages.keepAndSend(key, text, generation, request, response);
      return;
    }
    const shared = door.actor === null && reading === 'open';
    const cacheControl = !isReading(request) ? noCache : shared ? publicCache : privateCache;
    await sendRepresentation(request, response, { status: rendered.status, contentType: html, text, cacheControl });
  }

  return {
    refuse,
    handler: async (request, response) => {
      try {
        await answer(request, response);
      } catch (error) {
        request.log.error({ err: error }, 'A page could not be made');
        if (response.headersSent) response.destroy();
        else await refuse(request, response, unexpected(request));
      }
    },
  };
}

/** Puts a page's own headers beside those that stand; cookies are added to cookies. */
function putHeaders(response: ExpressResponse, headers: Headers): void {
  for (const [name, value] of headers) {
    if (name === 'set-cookie') response.append(name, value);
    else response.setHeader(name, value);
  }
}

async function sendFetched(response: ExpressResponse, fetched: Response): Promise<void> {
  putHeaders(response, fetched.headers);
  if (!fetched.headers.has('cache-control')) response.setHeader('Cache-Control', noCache);
  response.status(fetched.status).end(Buffer.from(await fetched.arrayBuffer()));
}
