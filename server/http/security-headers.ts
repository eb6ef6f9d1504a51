import { IncomingMessage, ServerResponse } from 'node:http';
import { Socket } from 'node:net';
import helmet from 'helmet';
import { isLoopback } from '../config/settings.ts';

type Middleware = (request: IncomingMessage, response: ServerResponse, next: (error?: unknown) => void) => void;

/**
 * The headers that keep a page's browser from being turned against its reader. Scripts and styles are our own files and
 * nothing else; only in development, where Vite puts both into the page, do they pass with a nonce.
 * @param nonce gives the nonce of a response in development; null in production
 */
export function createSecurityHeaders(baseUrl: URL, nonce: ((response: ServerResponse) => string) | null): Middleware {
  const secure = baseUrl.protocol === 'https:';
  const own = ["'self'"];
  const ownOrNonce =
    nonce === null ? own : [...own, (_: IncomingMessage, response: ServerResponse) => `'nonce-${nonce(response)}'`];
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: own,
        scriptSrc: ownOrNonce,
        styleSrc: ownOrNonce,
        imgSrc: ["'self'", 'data:'],
        connectSrc: nonce === null ? own : [...own, 'ws:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: own,
        frameAncestors: ["'none'"],
        ...(secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    // `no-referrer` would make browsers send `Origin: null` with our own forms.
    referrerPolicy: { policy: 'same-origin' },
    strictTransportSecurity: secure,
    // Browsers heed these only where the address can be trusted, and complain elsewhere.
    crossOriginOpenerPolicy: secure || isLoopback(baseUrl),
    originAgentCluster: secure || isLoopback(baseUrl),
    xFrameOptions: { action: 'deny' },
  });
}

/** The same headers as a list, for answers that are given before any middleware. */
export function readHeaders(middleware: Middleware): Readonly<Record<string, string>> {
  const response = new ServerResponse(new IncomingMessage(new Socket()));
  middleware(response.req, response, () => {});
  return Object.fromEntries(Object.entries(response.getHeaders()).map(([name, value]) => [name, String(value)]));
}
