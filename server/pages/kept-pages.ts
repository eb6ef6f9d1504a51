import { createHash } from 'node:crypto';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';

/** A page as it is sent to every visitor, in each form that browsers ask for. */
export interface KeptPage {
  /** Weak, since it is one for all three forms. */
  readonly etag: string;
  readonly headers: Readonly<Record<string, string>>;
  readonly identity: Buffer;
  /** Null until it is made, in the background. */
  readonly gzip: Buffer | null;
  readonly brotli: Buffer | null;
}

export interface KeptPages {
  /** A number that every `clear` raises: ask for it before a page is made, and give it to `put`. */
  generation(): number;
  get(key: string): KeptPage | null;
  /**
   * Keeps a page. One that was begun before the last `clear` is made up but not kept, since what it shows may be old.
   * @param key path and variant
   */
  put(key: string, html: string | Buffer, headers: Readonly<Record<string, string>>, generation: number): KeptPage;
  clear(): void;
  /** Resolves when nothing is left to compress. */
  compressed(): Promise<void>;
}

interface Entry {
  page: KeptPage;
  bytes: number;
}

const brotli = promisify(brotliCompress);
const gzipped = promisify(gzip);

/**
 * Keeps rendered pages of visitors in memory, so that sending one costs no more than sending a file. They are
 * compressed once, as well as can be (80 ms a page), after the first visitor has had theirs.
 * @param mostBytes memory for all of them; the ones longest not asked for go first
 */
export function createKeptPages(mostBytes: number): KeptPages {
  const entries = new Map<string, Entry>();
  let bytes = 0;
  let generation = 0;
  let compressing = Promise.resolve();

  function drop(key: string): void {
    bytes -= entries.get(key)?.bytes ?? 0;
    entries.delete(key);
  }

  function makeRoom(): void {
    for (const key of entries.keys()) {
      if (bytes <= mostBytes) return;
      drop(key);
    }
  }

  async function compress(key: string, entry: Entry): Promise<void> {
    if (entries.get(key) !== entry) return;
    const { identity } = entry.page;
    const parameters = {
      [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY,
      [constants.BROTLI_PARAM_MODE]: constants.BROTLI_MODE_TEXT,
      [constants.BROTLI_PARAM_SIZE_HINT]: identity.length,
    };
    const small = await gzipped(identity, { level: constants.Z_BEST_COMPRESSION });
    const smallest = await brotli(identity, { params: parameters });
    if (entries.get(key) !== entry) return;
    entry.page = { ...entry.page, gzip: small, brotli: smallest };
    entry.bytes += small.length + smallest.length;
    bytes += small.length + smallest.length;
    makeRoom();
  }

  return {
    generation: () => generation,
    get(key) {
      const entry = entries.get(key);
      if (entry === undefined) return null;
      // Put back at the end: the first ones of the map are those longest not asked for.
      entries.delete(key);
      entries.set(key, entry);
      return entry.page;
    },
    put(key, html, headers, begunIn) {
      const identity = typeof html === 'string' ? Buffer.from(html) : html;
      const etag = `W/"${createHash('sha256').update(identity).digest('base64url').slice(0, 22)}"`;
      const page: KeptPage = { etag, headers, identity, gzip: null, brotli: null };
      if (begunIn !== generation) return page;
      const entry: Entry = { page, bytes: identity.length };
      drop(key);
      entries.set(key, entry);
      bytes += entry.bytes;
      makeRoom();
      // One after another, so that a crawl of the book leaves threads for everything else.
      // What cannot be compressed is sent as it is, and must not keep the next one from it.
      compressing = compressing.then(() => compress(key, entry)).catch(() => undefined);
      return page;
    },
    clear() {
      generation += 1;
      entries.clear();
      bytes = 0;
    },
    compressed: () => compressing,
  };
}
