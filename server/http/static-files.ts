import { existsSync, readdirSync, readFileSync } from 'node:fs';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { extname, join, relative, sep } from 'node:path';
import { chooseEncoding, entityTag, namesTag, tagOf, type Encoding } from './representation.ts';

/** A file of the site as it is sent, in each form that the build made of it. */
interface StaticFile {
  readonly tag: string;
  readonly contentType: string;
  readonly cacheControl: string;
  readonly forms: Readonly<Partial<Record<Encoding, Buffer>>> & { readonly identity: Buffer };
}

/** The built site's files, from memory. */
export interface StaticFiles {
  /** Answers a `GET` or `HEAD` for one of the files; false where there is none at this address. */
  send(request: IncomingMessage, response: ServerResponse): boolean;
}

const contentTypes: Readonly<Record<string, string>> = {
  '.css': 'text/css; charset=utf-8',
  '.ico': 'image/x-icon',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.map': 'application/json; charset=utf-8',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.txt': 'text/plain; charset=utf-8',
  '.webmanifest': 'application/manifest+json',
  '.webp': 'image/webp',
  '.woff': 'font/woff',
  '.woff2': 'font/woff2',
};

/** Files below it carry a hash of their content in their name, so another content is another address. */
const hashedFolder = '/assets/';
const aYear = 'public, max-age=31536000, immutable';
const askAgain = 'public, max-age=0, must-revalidate';

/**
 * Reads the files of the built site once; the build has put their compressed forms beside them.
 * @param folder `dist/client`
 * @param securityHeaders what every answer carries
 */
export function createStaticFiles(folder: string, securityHeaders: Readonly<Record<string, string>>): StaticFiles {
  const files = new Map(readFiles(folder));
  return {
    send(request, response) {
      const [path = ''] = (request.url ?? '').split('?', 1);
      const file = files.get(path);
      if (file === undefined) return false;
      const wanted = chooseEncoding(request.headers['accept-encoding']);
      const body = file.forms[wanted];
      const encoding = body === undefined ? 'identity' : wanted;
      const headers: Record<string, string | number> = {
        ...securityHeaders,
        ETag: entityTag(file.tag, encoding),
        'Cache-Control': file.cacheControl,
        Vary: 'Accept-Encoding',
      };
      const known = request.headers['if-none-match'];
      if (known !== undefined && namesTag(known, file.tag)) {
        response.writeHead(304, headers).end();
        return true;
      }
      const bytes = body ?? file.forms.identity;
      headers['Content-Type'] = file.contentType;
      headers['Content-Length'] = bytes.length;
      if (encoding !== 'identity') headers['Content-Encoding'] = encoding;
      response.writeHead(200, headers);
      response.end(request.method === 'HEAD' ? undefined : bytes);
      return true;
    },
  };
}

function* readFiles(folder: string): Generator<[string, StaticFile]> {
  for (const entry of readdirSync(folder, { recursive: true, withFileTypes: true })) {
    if (!entry.isFile()) continue;
    const path = join(entry.parentPath, entry.name);
    const contentType = contentTypes[extname(entry.name)];
    const address = `/${relative(folder, path).split(sep).join('/')}`;
    // The template, compressed forms and what the build keeps for itself (`.vite`) are no addresses of their own.
    if (contentType === undefined || address.startsWith('/.')) continue;
    const identity = readFileSync(path);
    const brotli = existsSync(`${path}.br`) ? readFileSync(`${path}.br`) : null;
    const gzip = existsSync(`${path}.gz`) ? readFileSync(`${path}.gz`) : null;
    yield [
      address,
      {
        tag: tagOf(identity),
        contentType,
        cacheControl: address.startsWith(hashedFolder) ? aYear : askAgain,
        forms: { identity, ...(brotli === null ? {} : { br: brotli }), ...(gzip === null ? {} : { gzip }) },
      },
    ];
  }
}
