import { describe, expect, it } from 'vitest';
import { compareCodePoints } from './code-point-order.ts';

describe('compareCodePoints', () => {
  it('puts + before -, capitals before small letters, and a beginning before what goes on', () => {
    expect(['b', 'B', '-', '+', 'Ba'].toSorted(compareCodePoints)).toEqual(['+', '-', 'B', 'Ba', 'b']);
  });

  it('orders by code points where the halves of a surrogate pair would mislead', () => {
    // U+1F600 is above U+FF5E, but its first half, U+D83D, is below.
    expect(compareCodePoints('\u{1F600}', '\uFF5E')).toBeGreaterThan(0);
  });
});
