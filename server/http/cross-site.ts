import type { IncomingMessage } from 'node:http';

const safeMethods: readonly string[] = ['GET', 'HEAD', 'OPTIONS', 'TRACE'];

/**
 * True where a request may not pass because another site could have made it in a member's browser: it changes
 * something, and neither `Origin` nor `Sec-Fetch-Site` says that it is ours. Browsers do not let a page forge either.
 * @param baseUrl the origin by which people reach the site
 */
export function isCrossSite({ method, headers }: IncomingMessage, baseUrl: URL): boolean {
  if (safeMethods.includes(method ?? '')) return false;
  const site = headers['sec-fetch-site'];
  if (site === 'same-origin') return false;
  // Browsers that send the header have decided; `none` is no page's doing, but neither is it ours.
  if (site === 'cross-site' || site === 'same-site') return true;
  return !isOurOrigin(headers.origin, headers.host, baseUrl);
}

/**
 * Where the site is served without TLS, it may be reached by several names (`localhost`, an address of the house), and
 * the `Host` that the browser asked for is one of them: no page can make a browser lie about it. With TLS there is one.
 */
function isOurOrigin(origin: string | undefined, host: string | undefined, baseUrl: URL): boolean {
  if (origin === undefined || !URL.canParse(origin)) return false;
  if (origin === baseUrl.origin) return true;
  return baseUrl.protocol === 'http:' && host !== undefined && new URL(origin).host === host.toLowerCase();
}
