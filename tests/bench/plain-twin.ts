import { createServer } from 'node:http';
import { brotliCompressSync, brotliDecompressSync, constants } from 'node:zlib';
import { rawGet, settledGet, type RawAnswer } from './raw-get.ts';

export interface PlainTwin {
  readonly origin: string;
  close(): Promise<void>;
}

/** Takes every script out of a page, those that hold its state and those that are only fetched ahead. */
export function withoutScripts(html: string): string {
  return html.replace(/<script\b[^>]*>[\s\S]*?<\/script>/g, '').replace(/<link\b[^>]*rel="modulepreload"[^>]*>/g, '');
}

/** A server that sends one page of a club without its scripts, and the same style sheets and fonts, from memory. */
export async function openPlainTwin(clubOrigin: string, pagePath: string): Promise<PlainTwin> {
  const page = await settledGet(clubOrigin + pagePath);
  const html = withoutScripts(brotliDecompressSync(page.bytes).toString());
  const params = { [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY };
  const kept = new Map<string, Promise<RawAnswer>>();
  kept.set(pagePath, Promise.resolve({ ...page, bytes: brotliCompressSync(html, { params }) }));

  const server = createServer((request, response) => {
    const path = request.url ?? '/';
    const answer = kept.get(path) ?? rawGet(clubOrigin + path);
    kept.set(path, answer);
    answer.then(
      ({ status, headers, bytes }) => {
        response.writeHead(status, { ...headers, 'content-length': bytes.length }).end(bytes);
      },
      () => response.writeHead(502).end(),
    );
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('the twin has no port');
  return {
    origin: `http://127.0.0.1:${String(address.port)}`,
    close: () =>
      new Promise((resolve) => {
        server.closeAllConnections();
        server.close(() => resolve());
      }),
  };
}
