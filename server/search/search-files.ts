import { createHash } from 'node:crypto';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import type { SearchFile } from './search-messages.ts';

const brotli = promisify(brotliCompress);
const zip = promisify(gzip);

/** Brotli's 9 is within two parts in a hundred of its 11 here and takes a tenth of the time: files change with every publication. */
const brotliQuality = 9;

/** Makes a file of the index: named by what it says, in each form that a browser may take. */
export async function makeFile(content: unknown): Promise<SearchFile> {
  const identity = Buffer.from(JSON.stringify(content));
  const [br, zipped] = await Promise.all([
    brotli(identity, {
      params: {
        [constants.BROTLI_PARAM_MODE]: constants.BROTLI_MODE_TEXT,
        [constants.BROTLI_PARAM_QUALITY]: brotliQuality,
        [constants.BROTLI_PARAM_SIZE_HINT]: identity.length,
      },
    }),
    zip(identity, { level: 9 }),
  ]);
  const name = `${createHash('sha256').update(identity).digest('base64url').slice(0, 22)}.json`;
  return { name, identity, br, gzip: zipped };
}

/** Which files make up the index now. */
export interface SearchManifest {
  readonly version: 1;
  readonly lines: { readonly name: string; readonly bytes: number };
  readonly prose: { readonly name: string; readonly bytes: number };
}

/** The manifest of two files; `bytes` is what each weighs compressed. */
export function manifestOf(lines: SearchFile, prose: SearchFile): SearchManifest {
  return {
    version: 1,
    lines: { name: lines.name, bytes: lines.br.byteLength },
    prose: { name: prose.name, bytes: prose.br.byteLength },
  };
}
