import { expect, it } from 'vitest';
import { cellText, namesIn, plainCell, saysNothing } from './cell-text.ts';

it('takes an empty cell and a dash of any length for nothing', () => {
  for (const cell of ['', ' ', '-', '–', ' — ']) {
    expect(saysNothing(cell)).toBe(true);
    expect(cellText(cell)).toBeNull();
  }
  expect(saysNothing('--')).toBe(false);
  expect(cellText(' Dip beam ')).toBe('Dip beam');
});

it('reads what stands in a code span, and leaves a cell with several alone', () => {
  expect(plainCell('`dip-switch.Y`')).toBe('dip-switch.Y');
  expect(plainCell('`a` and `b`')).toBe('`a` and `b`');
});

it('divides names at commas and semicolons', () => {
  expect(namesIn('m1, m2; c1,,')).toEqual(['m1', 'm2', 'c1']);
  expect(namesIn(' ')).toEqual([]);
});
