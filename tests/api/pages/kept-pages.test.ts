import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { createKeptPages } from '../../../server/pages/kept-pages.ts';

const html = `<p>${'Take the earthed lead off first. '.repeat(50)}</p>`;
const megabyte = 1024 * 1024;

describe('kept pages', () => {
  it('keeps a page as it is at once, and compressed both ways when that is done', async () => {
    const kept = createKeptPages(megabyte);
    const put = kept.put('/donors/d', html, { 'content-type': 'text/html' }, kept.generation());
    expect(kept.get('/donors/d')).toEqual(put);
    expect([put.identity.toString(), put.gzip, put.brotli]).toEqual([html, null, null]);
    await kept.compressed();
    const page = kept.get('/donors/d');
    expect(page?.gzip && gunzipSync(page.gzip).toString()).toBe(html);
    expect(page?.brotli && brotliDecompressSync(page.brotli).toString()).toBe(html);
    expect(page?.etag).toBe(put.etag);
    expect(page?.headers).toEqual({ 'content-type': 'text/html' });
  });

  it('gives the same page the same mark, and another page another', () => {
    const kept = createKeptPages(megabyte);
    const marks = ['one', 'one', 'two'].map((text, index) => kept.put(String(index), text, {}, kept.generation()).etag);
    expect(marks[0]).toBe(marks[1]);
    expect(marks[0]).not.toBe(marks[2]);
  });

  it('keeps nothing that was begun before something was published', async () => {
    const kept = createKeptPages(megabyte);
    const begunIn = kept.generation();
    kept.put('/old', html, {}, begunIn);
    kept.clear();
    kept.put('/late', html, {}, begunIn);
    await kept.compressed();
    expect([kept.get('/old'), kept.get('/late')]).toEqual([null, null]);
  });

  it('lets those go that were longest not asked for, when they are too many', () => {
    const kept = createKeptPages(html.length * 2);
    kept.put('a', html, {}, kept.generation());
    kept.put('b', html, {}, kept.generation());
    kept.get('a');
    kept.put('c', html, {}, kept.generation());
    expect(['a', 'b', 'c'].map((key) => kept.get(key) !== null)).toEqual([true, false, true]);
  });
});
