import { expect, it } from 'vitest';
import { quantity } from './units.ts';

it('gives a finite number its unit and refuses any other', () => {
  expect(quantity<'metres'>(2.4)).toBe(2.4);
  expect(() => quantity(Number.NaN)).toThrow(RangeError);
  expect(() => quantity(Number.POSITIVE_INFINITY)).toThrow(RangeError);
});
