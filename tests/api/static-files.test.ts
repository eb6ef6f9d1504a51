import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { compressFiles } from '../../.config/compress.mjs';
import { openHttpClub } from '../factories/http-club.ts';
import { temporaryFolder } from '../setup/database.ts';

const script = 'console.log("Y/R");\n'.repeat(100);

/** A built site of three files, with their compressed forms as the build makes them. */
function buildSite(): string {
  const folder = temporaryFolder();
  mkdirSync(join(folder, 'assets'));
  mkdirSync(join(folder, '.vite'));
  writeFileSync(join(folder, 'assets', 'entry-abc123.js'), script);
  writeFileSync(join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
  writeFileSync(join(folder, 'index.html'), '<!--head-->');
  writeFileSync(join(folder, '.vite', 'manifest.json'), '{}');
  compressFiles(folder);
  return folder;
}

async function openBuiltClub() {
  const club = await openHttpClub({ clientFolder: buildSite() });
  return club.openBrowser();
}

describe('a file of the site', () => {
  test('whose name carries its content is kept for a year', async () => {
    const response = await (await openBuiltClub())('/assets/entry-abc123.js');
    expect(response.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
    expect(response.headers.get('content-type')).toBe('text/javascript; charset=utf-8');
    expect(await response.text()).toBe(script);
  });

  test('with a name of its own is asked for again', async () => {
    const browser = await openBuiltClub();
    const response = await browser('/favicon.svg');
    expect(response.headers.get('cache-control')).toBe('public, max-age=0, must-revalidate');
    const known = { 'if-none-match': response.headers.get('etag') ?? '' };
    expect((await browser('/favicon.svg', { headers: known })).status).toBe(304);
  });

  test('is sent as the build compressed it', async () => {
    const browser = await openBuiltClub();
    for (const encoding of ['br', 'gzip']) {
      const response = await browser('/assets/entry-abc123.js', { headers: { 'accept-encoding': encoding } });
      expect(response.headers.get('content-encoding')).toBe(encoding);
      expect(Number(response.headers.get('content-length'))).toBeLessThan(script.length / 10);
      expect(await response.text()).toBe(script);
    }
  });

  test('has its security headers, answers HEAD, and needs no session', async () => {
    const response = await (
      await openBuiltClub()
    )('/assets/entry-abc123.js?v=1', {
      method: 'HEAD',
      headers: { 'accept-encoding': 'identity' },
    });
    expect(response.status).toBe(200);
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
    expect(response.headers.get('content-length')).toBe(String(script.length));
    expect(response.headers.getSetCookie()).toEqual([]);
  });

  test.each([
    '/index.html',
    '/.vite/manifest.json',
    '/assets/entry-abc123.js.br',
    '/assets/../index.html',
    '/assets/nothing.js',
  ])('is not what stands at %s', async (path) => {
    expect((await (await openBuiltClub())(path)).status).toBe(404);
  });
});

test('the build keeps every byte of what it compresses', () => {
  const path = join(buildSite(), 'assets', 'entry-abc123.js');
  expect(brotliDecompressSync(readFileSync(`${path}.br`)).toString()).toBe(script);
  expect(gunzipSync(readFileSync(`${path}.gz`)).toString()).toBe(script);
});
