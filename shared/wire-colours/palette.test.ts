import { expect, it } from 'vitest';
import { colourNames } from './colour-system.ts';
import { colourHex } from './palette.ts';

it('draws every colour, and no two alike', () => {
  const drawn = colourNames.map((name) => colourHex[name]);
  expect(new Set(drawn).size).toBe(colourNames.length);
  for (const hex of drawn) expect(hex).toMatch(/^#[0-9A-F]{6}$/);
});
