import { describe, expect, it } from 'vitest';
import { displayWidth, padToWidth } from './display-width.ts';

describe('displayWidth', () => {
  it.each([
    ['●', 1],
    ['mm²', 3],
    ['Ω', 1],
    ['e\u0301', 1],
    ['車', 2],
    ['', 0],
  ])('of %j is %i', (text, width) => {
    expect(displayWidth(text)).toBe(width);
  });
});

describe('padToWidth', () => {
  it('fills on the side that the text does not stand on, and leaves a wider text alone', () => {
    expect(padToWidth('●', 3)).toBe('●  ');
    expect(padToWidth('12', 4, 'right')).toBe('  12');
    expect(padToWidth('a', 4, 'center')).toBe(' a  ');
    expect(padToWidth('longer', 3)).toBe('longer');
  });
});
