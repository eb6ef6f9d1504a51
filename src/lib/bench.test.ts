import { describe, expect, it } from 'vitest';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { benchCookies, emptyBench, readBench, variantFor, variantQuery, variantWords } from './bench.ts';

const british1980 = { year: 1980, market: 'UK', frame: null };
const qf550 = { shelf: 'donors', subject: 'qf550' } as const;

function asCookieHeader(setCookies: readonly string[]): string {
  return setCookies.map((cookie) => cookie.split(';')[0]).join('; ');
}

describe('the bench', () => {
  it('is read back from the cookies that keep it', () => {
    const bench = { donor: 'qf550', variant: { year: 1980, market: 'UK & Ireland', frame: 'A1–A9' } };
    expect(readBench(asCookieHeader(benchCookies(bench)))).toEqual(bench);
  });

  it('is empty where there is no cookie, or where the donor cannot be one', () => {
    expect(readBench('')).toEqual(emptyBench);
    expect(readBench('bench=../../etc; variant=year%3D1980')).toEqual(emptyBench);
    expect(readBench('bench=%E0%A4%A')).toEqual(emptyBench);
  });

  it('is cleared by cookies that end at once', () => {
    for (const cookie of benchCookies(emptyBench)) expect(cookie).toContain('Max-Age=0');
  });

  it('keeps what can be read of a variant and leaves the rest unchosen', () => {
    expect(readBench('bench=qf550; variant=year%3D19800%26market%3DUK').variant).toEqual({
      ...british1980,
      year: null,
    });
  });
});

describe('the variant that a sheet is shown for', () => {
  const bench = { donor: 'qf550', variant: british1980 };

  it('is the bench’s on the donor that is on the bench', () => {
    expect(variantFor(qf550, new URLSearchParams(), bench)).toEqual(british1980);
  });

  it('is no other bike’s: its year says nothing about this one', () => {
    expect(variantFor({ ...qf550, subject: 'kestova-360' }, new URLSearchParams(), bench)).toEqual(anyVariant);
  });

  it('is nobody’s on a part, which is of no year of a bike', () => {
    const part = { shelf: 'parts', subject: 'qf550' } as const;
    expect(variantFor(part, new URLSearchParams('year=1979'), bench)).toEqual(anyVariant);
  });

  it('is the address’s where that names one, even to take the bench’s choice back', () => {
    expect(variantFor(qf550, new URLSearchParams('year=1979'), bench)).toEqual({ ...anyVariant, year: 1979 });
    expect(variantFor(qf550, new URLSearchParams('year='), bench)).toEqual(anyVariant);
  });

  it('stands in an address and in words as far as it is chosen', () => {
    expect(variantQuery(anyVariant)).toBe('');
    expect(variantQuery(british1980)).toBe('?year=1980&market=UK');
    expect(variantWords(anyVariant)).toBeNull();
    expect(variantWords({ ...british1980, frame: 'A2' })).toBe('1980, UK, frame A2');
  });
});
