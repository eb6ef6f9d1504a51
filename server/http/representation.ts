import { createHash } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';

/** How bytes travel. */
export type Encoding = 'br' | 'gzip' | 'identity';

const brotli = promisify(brotliCompress);
const zip = promisify(gzip);

/** Under this many bytes compressing saves no packet. */
const leastCompressed = 1024;

/**
 * How hard to compress: what is kept and sent often is worth Brotli's best, about 80 ms a page away from the main
 * thread; what is sent once is not.
 */
export type Effort = 'kept' | 'once';

/** The encoding that a client prefers among ours; `identity` where it accepts no other. */
export function chooseEncoding(acceptEncoding: string | undefined): Encoding {
  if (acceptEncoding === undefined) return 'identity';
  const accepted = new Map<string, number>();
  for (const part of acceptEncoding.toLowerCase().split(',')) {
    const [name = '', ...parameters] = part.split(';').map((word) => word.trim());
    const quality = parameters.find((parameter) => parameter.startsWith('q='));
    accepted.set(name, quality === undefined ? 1 : Number(quality.slice(2)) || 0);
  }
  const qualityOf = (name: string): number => accepted.get(name) ?? accepted.get('*') ?? 0;
  if (qualityOf('br') > 0 && qualityOf('br') >= qualityOf('gzip')) return 'br';
  return qualityOf('gzip') > 0 ? 'gzip' : 'identity';
}

/** Compresses away from the main thread. */
export async function compress(bytes: Buffer, encoding: Encoding, effort: Effort): Promise<Buffer> {
  switch (encoding) {
    case 'identity':
      return bytes;
    case 'gzip':
      return zip(bytes, { level: effort === 'kept' ? 9 : 6 });
    case 'br':
      return brotli(bytes, {
        params: {
          [constants.BROTLI_PARAM_MODE]: constants.BROTLI_MODE_TEXT,
          [constants.BROTLI_PARAM_QUALITY]: effort === 'kept' ? 11 : 4,
          [constants.BROTLI_PARAM_SIZE_HINT]: bytes.length,
        },
      });
  }
}

/** True where compressing so many bytes is worth it. */
export function isWorthCompressing(bytes: Buffer): boolean {
  return bytes.length >= leastCompressed;
}

/** What tells one state of a text from another. */
export function tagOf(bytes: Buffer | string): string {
  return createHash('sha256').update(bytes).digest('base64url').slice(0, 22);
}

/** The `ETag` of one encoding: other bytes have another strong tag. */
export function entityTag(tag: string, encoding: Encoding): string {
  return encoding === 'identity' ? `"${tag}"` : `"${tag}-${encoding}"`;
}

/** True where an `If-None-Match` or `If-Match` header names this state, in whatever encoding it was read. */
export function namesTag(header: string, tag: string): boolean {
  if (header.trim() === '*') return true;
  return header.split(',').some((named) => {
    const opaque = named.trim().replace(/^W\//, '').replace(/^"|"$/g, '');
    return opaque === tag || opaque === `${tag}-br` || opaque === `${tag}-gzip`;
  });
}

/** A text to send, as such or in UTF-8, and how it may be kept by others. */
export interface Representation {
  readonly status: number;
  readonly contentType: string;
  readonly text: string | Buffer;
  readonly cacheControl: string;
}

/** For whoever may not see what another may: neither shared, nor used without asking again. */
export const privateCache = 'private, no-cache';
/** For what every visitor may read: kept by anybody, used only after asking whether it still holds. */
export const publicCache = 'public, max-age=0, must-revalidate';
/** For what must not be kept at all. */
export const noCache = 'no-store';

/** The page differs by encoding, and by who is signed in and what is on their bench. */
export const vary = 'Accept-Encoding, Cookie';

/** Sends a text in the encoding that the client prefers; 304 where it has read this state already. */
export async function sendRepresentation(
  request: IncomingMessage,
  response: ServerResponse,
  { status, contentType, text, cacheControl }: Representation,
): Promise<void> {
  const bytes = typeof text === 'string' ? Buffer.from(text) : text;
  response.setHeader('Cache-Control', cacheControl);
  response.setHeader('Vary', vary);
  const wanted = isWorthCompressing(bytes) ? chooseEncoding(request.headers['accept-encoding']) : 'identity';
  if (status === 200 && cacheControl !== noCache) {
    const tag = tagOf(bytes);
    response.setHeader('ETag', entityTag(tag, wanted));
    const known = request.headers['if-none-match'];
    if (isReading(request) && known !== undefined && namesTag(known, tag)) {
      response.writeHead(304).end();
      return;
    }
  }
  const body = await compress(bytes, wanted, 'once');
  if (wanted !== 'identity') response.setHeader('Content-Encoding', wanted);
  response.setHeader('Content-Type', contentType);
  response.setHeader('Content-Length', body.length);
  response.writeHead(status);
  response.end(request.method === 'HEAD' ? undefined : body);
}

/** True for the methods that only read. */
export function isReading({ method }: IncomingMessage): boolean {
  return method === 'GET' || method === 'HEAD';
}
