import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { slipsBetween, slipsForgiven, swapped } from './spelling.ts';

const word = fc.string({ unit: fc.constantFrom(...'abcde'), maxLength: 7 });

/** The same by the book: each way of the last step, without remembering anything. */
function naiveSlips(a: string, b: string): number {
  if (a === '' || b === '') return Math.max(a.length, b.length);
  const last = a.at(-1) === b.at(-1) ? 0 : 1;
  const ways = [
    naiveSlips(a.slice(0, -1), b) + 1,
    naiveSlips(a, b.slice(0, -1)) + 1,
    naiveSlips(a.slice(0, -1), b.slice(0, -1)) + last,
  ];
  if (a.length > 1 && b.length > 1 && a.at(-1) === b.at(-2) && a.at(-2) === b.at(-1)) {
    ways.push(naiveSlips(a.slice(0, -2), b.slice(0, -2)) + 1);
  }
  return Math.min(...ways);
}

describe('slips', () => {
  test('are counted as one would by hand, up to the most that is asked for', () => {
    fc.assert(
      fc.property(word, word, fc.integer({ min: 0, max: 3 }), (a, b, most) => {
        expect(slipsBetween(a, b, most)).toBe(Math.min(naiveSlips(a, b), most + 1));
      }),
      { numRuns: 200 },
    );
  });

  test('of two swapped letters are one', () => {
    expect(slipsBetween('neutrla', 'neutral', 2)).toBe(1);
    expect(swapped('neutrla')).toContain('neutral');
  });

  test('are forgiven in long words, never in short ones, nor in what has a digit or a slash', () => {
    expect(['pin', 'horn', 'light', 'alternator', 'qf550', 'y/r'].map(slipsForgiven)).toEqual([0, 0, 1, 2, 0, 0]);
  });
});
