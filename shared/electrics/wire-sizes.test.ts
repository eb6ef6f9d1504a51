import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readWireSize } from './wire-sizes.ts';

describe('readWireSize', () => {
  it.each(['0.85', '0,85', '0.85 mm²', '0.85mm2', '0.85 sq', '0.85 sqmm', ' .85 '])(
    'reads %j as 0.85 mm²',
    (written) => {
      expect(readWireSize(written)?.squareMillimetres).toBe(0.85);
    },
  );

  it.each(['AWG 18', '18 AWG', 'awg18', 'AWG #18'])('reads %j as a gauge', (written) => {
    expect(readWireSize(written)?.squareMillimetres).toBeCloseTo(0.823, 3);
  });

  it('reads gauges of several noughts', () => {
    expect(readWireSize('2/0 AWG')?.squareMillimetres).toBeCloseTo(67.43, 2);
  });

  it('reckons strands and their diameter: 28/0.30 is 1.98 mm²', () => {
    expect(readWireSize('28/0.30')?.squareMillimetres).toBeCloseTo(28 * Math.PI * 0.15 ** 2, 10);
    expect(readWireSize('28/0,30 mm')?.squareMillimetres).toBe(readWireSize('28/0.30')?.squareMillimetres);
    expect(readWireSize('7/12/0.45')?.squareMillimetres).toBeCloseTo(13.36, 2);
  });

  it('reads the flexible sizes of the Japanese standard', () => {
    expect(readWireSize('0.5f')?.squareMillimetres).toBe(0.5);
  });

  it('keeps what was written', () => {
    expect(readWireSize(' AWG 18 ')?.written).toBe('AWG 18');
  });

  it.each(['', '?', 'thick', '300', '0.01', 'AWG 99', '28/30', '0,85,1', '-1'])('leaves %j unread', (written) => {
    expect(readWireSize(written)).toBeNull();
  });

  it('never throws, and believes no size outside 0.05 to 120 mm²', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9/., awgAWGmfsq²]{0,12}$/)), (written) => {
        const size = readWireSize(written);
        if (size === null) return;
        expect(size.squareMillimetres).toBeGreaterThanOrEqual(0.05);
        expect(size.squareMillimetres).toBeLessThanOrEqual(120);
      }),
    );
  });
});
