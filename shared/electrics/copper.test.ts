import { describe, expect, it } from 'vitest';
import { copperResistance } from './copper.ts';
import { quantity } from './units.ts';

describe('copperResistance', () => {
  it('is 1/58 Ω for a metre of one square millimetre at 20 °C', () => {
    expect(copperResistance(quantity(1), quantity(1))).toBeCloseTo(1 / 58, 12);
  });

  it('doubles with the length and halves with the cross-section', () => {
    const one = copperResistance(quantity(1), quantity(1));
    expect(copperResistance(quantity(2), quantity(1))).toBeCloseTo(2 * one, 12);
    expect(copperResistance(quantity(1), quantity(2))).toBeCloseTo(one / 2, 12);
  });

  it('rises by 39.3 % from 20 to 120 °C', () => {
    const cold = copperResistance(quantity(1), quantity(1));
    expect(copperResistance(quantity(1), quantity(1), quantity(120)) / cold).toBeCloseTo(1.393, 10);
  });

  it('refuses what no wire can be', () => {
    expect(() => copperResistance(quantity(-1), quantity(1))).toThrow(RangeError);
    expect(() => copperResistance(quantity(1), quantity(0))).toThrow(RangeError);
    expect(() => copperResistance(quantity(1), quantity(1), quantity(300))).toThrow(RangeError);
  });
});
