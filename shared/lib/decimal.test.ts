import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readDecimal } from './decimal.ts';

describe('readDecimal', () => {
  it.each([
    ['0.85', 0.85],
    ['0,85', 0.85],
    ['.5', 0.5],
    ['−3', -3],
    ['+12', 12],
    [' 7 ', 7],
    ['0,250', 0.25],
  ])('reads %s', (written, value) => {
    expect(readDecimal(written)).toBe(value);
  });

  it.each(['', 'five', '1.2.3', '1e3', '12 V', '0x10', 'Infinity'])('leaves %j unread', (written) => {
    expect(readDecimal(written)).toBeNull();
  });

  it('does not guess whether 1,000 is one or a thousand', () => {
    expect(readDecimal('1,000')).toBeNull();
    expect(readDecimal('1.000')).toBe(1);
  });

  it('reads with a comma what it reads with a point, up to two decimals', () => {
    fc.assert(
      fc.property(fc.integer({ min: -99_999, max: 99_999 }), (hundredths) => {
        const point = (hundredths / 100).toFixed(2);
        expect(readDecimal(point.replace('.', ','))).toBe(readDecimal(point));
        expect(readDecimal(point)).toBe(Number(point));
      }),
    );
  });
});
