import type { IncomingMessage, ServerResponse } from 'node:http';
import type { KeptPage, KeptPages } from '../pages/kept-pages.ts';
import { chooseEncoding, compress, isReading, namesTag, publicCache, vary } from './representation.ts';

/** Pages that every visitor sees alike, answered from memory. */
export interface VisitorPages {
  /** Answers a visitor's request for a page that is kept; false where it is not. */
  send(request: IncomingMessage, response: ServerResponse): boolean;
  /** Under which key the page of this request may be kept; null where it may not. */
  keyOf(request: IncomingMessage): string | null;
  /** The page of this key that somebody else is having rendered; null where nobody is. */
  underWay(key: string): Promise<void> | null;
  /** Tells the others that the page of this key is being rendered, until the function that it gives is called. */
  begin(key: string): () => void;
  /** Ask before a page is rendered, and give it to `keepAndSend`. */
  generation(): number;
  /** Keeps a page that was rendered for this key, and sends it. */
  keepAndSend(
    key: string,
    html: Buffer,
    generation: number,
    request: IncomingMessage,
    response: ServerResponse,
  ): Promise<void>;
}

const variantNames: readonly string[] = ['year', 'market', 'frame'];
/** What of a visitor's own choices a page is made with (src/lib/bench.ts). */
const choiceCookies: readonly string[] = ['bench', 'variant'];
const longestKey = 300;

/**
 * @param sessionCookie whoever has it may be a member
 * @param securityHeaders what every answer carries
 */
export function createVisitorPages(
  kept: KeptPages,
  sessionCookie: string,
  securityHeaders: Readonly<Record<string, string>>,
): VisitorPages {
  const headers = {
    ...securityHeaders,
    'Content-Type': 'text/html; charset=utf-8',
    'Cache-Control': publicCache,
    Vary: vary,
  };

  const rendering = new Map<string, Promise<void>>();

  function keyOf(request: IncomingMessage): string | null {
    if (!isReading(request)) return null;
    const { url = '', headers: asked } = request;
    const address = url.includes('?') ? canonicalAddress(url) : url;
    if (address === null) return null;
    const choices = asked.cookie === undefined ? '' : choicesOf(asked.cookie, sessionCookie);
    if (choices === null) return null;
    const key = choices === '' ? address : `${address} ${choices}`;
    return key.length > longestKey ? null : key;
  }

  async function sendPage(page: KeptPage, request: IncomingMessage, response: ServerResponse): Promise<void> {
    const known = request.headers['if-none-match'];
    if (known !== undefined && namesTag(known, page.etag.replace(/^W\/|"/g, ''))) {
      response.writeHead(304, { ...page.headers, ETag: page.etag }).end();
      return;
    }
    const wanted = chooseEncoding(request.headers['accept-encoding']);
    const best = wanted === 'br' ? page.brotli : wanted === 'gzip' ? page.gzip : page.identity;
    // Whoever comes before the best form is made waits for a quick one, which is still a tenth of the page.
    const body = best ?? (await compress(page.identity, wanted, 'once'));
    response.writeHead(200, {
      ...page.headers,
      ETag: page.etag,
      'Content-Length': body.length,
      ...(wanted === 'identity' ? {} : { 'Content-Encoding': wanted }),
    });
    response.end(request.method === 'HEAD' ? undefined : body);
  }

  return {
    keyOf,
    underWay: (key) => rendering.get(key) ?? null,
    begin(key) {
      let end = (): void => {};
      const rendered = new Promise<void>((resolve) => (end = resolve));
      rendering.set(key, rendered);
      return () => {
        if (rendering.get(key) === rendered) rendering.delete(key);
        end();
      };
    },
    generation: () => kept.generation(),
    send(request, response) {
      const key = keyOf(request);
      const page = key === null ? null : kept.get(key);
      if (page === null) return false;
      sendPage(page, request, response).catch(() => response.destroy());
      return true;
    },
    keepAndSend(key, html, generation, request, response) {
      return sendPage(kept.put(key, html, headers, generation), request, response);
    },
  };
}

/** The address with the variant in one order, so that one page is kept once; null where the query asks for more. */
function canonicalAddress(url: string): string | null {
  const at = url.indexOf('?');
  const asked = new URLSearchParams(url.slice(at + 1));
  const canonical = new URLSearchParams();
  for (const name of variantNames) {
    const [value, ...more] = asked.getAll(name);
    if (more.length > 0) return null;
    if (value !== undefined) canonical.set(name, value);
  }
  if (asked.size !== canonical.size) return null;
  return canonical.size === 0 ? url.slice(0, at) : `${url.slice(0, at)}?${canonical.toString()}`;
}

/** The choices of a `Cookie` header in one order; null where it has a session. */
function choicesOf(cookies: string, sessionCookie: string): string | null {
  const choices: string[] = [];
  for (const pair of cookies.split(';')) {
    const cookie = pair.trim();
    const name = cookie.slice(0, cookie.indexOf('='));
    if (name === sessionCookie) return null;
    if (choiceCookies.includes(name)) choices.push(cookie);
  }
  return choices.sort().join(' ');
}
