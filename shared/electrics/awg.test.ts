import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { awgDiameterMillimetres, awgSquareMillimetres, finestGauge, thickestGauge } from './awg.ts';

describe('American wire gauge', () => {
  it('has the two diameters that it is built on: 0.46 in for 4/0, 0.005 in for 36', () => {
    expect(awgDiameterMillimetres(-3)).toBeCloseTo(0.46 * 25.4, 10);
    expect(awgDiameterMillimetres(36)).toBeCloseTo(0.005 * 25.4, 10);
  });

  it('gets thinner with every number', () => {
    fc.assert(
      fc.property(fc.integer({ min: thickestGauge, max: finestGauge - 1 }), (gauge) => {
        expect(awgSquareMillimetres(gauge + 1)).toBeLessThan(awgSquareMillimetres(gauge));
      }),
    );
  });

  it('refuses a gauge that is not a whole number in the table', () => {
    expect(() => awgSquareMillimetres(18.5)).toThrow(RangeError);
    expect(() => awgSquareMillimetres(41)).toThrow(RangeError);
    expect(() => awgDiameterMillimetres(-4)).toThrow(RangeError);
  });
});
