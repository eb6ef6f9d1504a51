import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { chooseEncoding, compress, entityTag, namesTag, tagOf } from '../../server/http/representation.ts';

describe('the encoding', () => {
  test.each([
    [undefined, 'identity'],
    ['', 'identity'],
    ['br', 'br'],
    ['gzip, deflate, br, zstd', 'br'],
    ['gzip, deflate', 'gzip'],
    ['GZIP', 'gzip'],
    ['*', 'br'],
    ['br;q=0, gzip', 'gzip'],
    ['br;q=0, gzip;q=0', 'identity'],
    ['*;q=0', 'identity'],
    ['br;q=0.2, gzip;q=0.8', 'gzip'],
    ['gzip;q=nonsense', 'identity'],
    ['deflate', 'identity'],
  ])('for %j is %s', (header, encoding) => {
    expect(chooseEncoding(header)).toBe(encoding);
  });

  test.each(['kept', 'once'] as const)('keeps every byte, compressed for being %s', async (effort) => {
    const bytes = Buffer.from('Y/R, yellow with a red tracer. '.repeat(200));
    expect(brotliDecompressSync(await compress(bytes, 'br', effort))).toEqual(bytes);
    expect(gunzipSync(await compress(bytes, 'gzip', effort))).toEqual(bytes);
    expect(await compress(bytes, 'identity', effort)).toBe(bytes);
  });
});

describe('a tag', () => {
  const tag = tagOf('the text');

  test('is the same for the same text, and another for another', () => {
    expect(tagOf(Buffer.from('the text'))).toBe(tag);
    expect(tagOf('the texts')).not.toBe(tag);
  });

  test('differs by encoding, since the bytes do', () => {
    expect(new Set([entityTag(tag, 'identity'), entityTag(tag, 'br'), entityTag(tag, 'gzip')]).size).toBe(3);
  });

  test.each([
    [`"${tag}"`, true],
    [`"${tag}-br"`, true],
    [`W/"${tag}-gzip"`, true],
    [`"other", "${tag}"`, true],
    ['*', true],
    ['"other"', false],
    [`"${tag}-other"`, false],
    ['', false],
  ])('is named by %s: %s', (header, named) => {
    expect(namesTag(header, tag)).toBe(named);
  });
});
