import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatYears, parseYears } from './years.ts';

describe('parseYears', () => {
  it.each([
    ['1978', [{ from: 1978, to: 1978 }]],
    ['1978-1981', [{ from: 1978, to: 1981 }]],
    ['1978–81', [{ from: 1978, to: 1981 }]],
    ['1999-02', [{ from: 1999, to: 2002 }]],
    ['1978 to 1981', [{ from: 1978, to: 1981 }]],
    ['1980-', [{ from: 1980, to: null }]],
    ['from 1980', [{ from: 1980, to: null }]],
    ['1980 on', [{ from: 1980, to: null }]],
    ['-1979', [{ from: null, to: 1979 }]],
    ['up to 1979', [{ from: null, to: 1979 }]],
    ['', []],
  ])('reads %j', (written, spans) => {
    expect(parseYears(written)).toEqual(spans);
  });

  it('sorts several spans and joins those that touch', () => {
    expect(parseYears('1981-, 1978, 1979')).toEqual([
      { from: 1978, to: 1979 },
      { from: 1981, to: null },
    ]);
    expect(parseYears('1978-1985, 1980')).toEqual([{ from: 1978, to: 1985 }]);
  });

  it.each(['1981-1978', '1981-78', '80', 'late models', '1978 1981', '-', '1700', '1978-2200', '1978-1979-1980'])(
    'leaves %j unread',
    (written) => {
      expect(parseYears(written)).toBeNull();
    },
  );

  it('reads what formatYears writes', () => {
    const year = fc.integer({ min: 1885, max: 2100 });
    fc.assert(
      fc.property(fc.array(fc.tuple(year, year), { maxLength: 5 }), (pairs) => {
        const spans = parseYears(pairs.map(([a, b]) => `${Math.min(a, b)}-${Math.max(a, b)}`).join(', '));
        expect(spans).not.toBeNull();
        expect(parseYears(formatYears(spans ?? []))).toEqual(spans);
        for (const [a] of pairs) expect(spans?.some(({ from, to }) => a >= (from ?? 0) && a <= (to ?? 0))).toBe(true);
      }),
    );
  });
});

describe('formatYears', () => {
  it('writes years as an address has them', () => {
    expect(formatYears([{ from: 1978, to: 1979 }])).toBe('1978-1979');
    expect(formatYears([{ from: 1980, to: null }])).toBe('1980-');
    expect(formatYears([{ from: null, to: 1979 }])).toBe('-1979');
    expect(
      formatYears([
        { from: 1978, to: 1978 },
        { from: 1980, to: null },
      ]),
    ).toBe('1978,1980-');
    expect(formatYears([])).toBe('');
  });
});
