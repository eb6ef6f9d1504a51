import { request, type IncomingHttpHeaders } from 'node:http';

export interface RawAnswer {
  readonly status: number;
  readonly headers: IncomingHttpHeaders;
  /** As it came over the wire: compressed where the server compressed it. */
  readonly bytes: Buffer;
}

/** Asks as a browser that takes Brotli does, and leaves the answer compressed. */
export function rawGet(url: string): Promise<RawAnswer> {
  return new Promise((resolve, reject) => {
    const asked = request(url, { headers: { 'accept-encoding': 'br' } }, (response) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => {
        resolve({ status: response.statusCode ?? 0, headers: response.headers, bytes: Buffer.concat(parts) });
      });
    });
    asked.on('error', reject);
    asked.end();
  });
}

/** Asks until the server has compressed the page in the background, which it does at first sight. */
export async function settledGet(url: string): Promise<RawAnswer> {
  let before = await rawGet(url);
  for (let attempt = 0; attempt < 50; attempt += 1) {
    await new Promise((resolve) => setTimeout(resolve, 300));
    const now = await rawGet(url);
    if (now.headers['content-encoding'] === 'br' && now.bytes.length === before.bytes.length) return now;
    before = now;
  }
  throw new Error(`${url} was never compressed`);
}
