import { expect, it } from 'vitest';
import { codesOf, colourCodes } from './colour-codes.ts';
import { colourSystemNames } from './colour-system.ts';

it('has one code a colour in every system, and no spelling twice', () => {
  for (const system of colourSystemNames) {
    const rows = colourCodes(system);
    const spellings = rows.flatMap(({ code, otherSpellings }) => [code, ...otherSpellings]);
    expect(new Set(rows.map(({ colour }) => colour)).size, system).toBe(rows.length);
    expect(new Set(spellings).size, system).toBe(spellings.length);
  }
});

it("reads a page's own key as a table", () => {
  expect(colourCodes('own')).toEqual([]);
  expect(codesOf({ name: 'own', key: { B: 'white', N: 'black' } })).toEqual([
    { code: 'B', colour: 'white', otherSpellings: [] },
    { code: 'N', colour: 'black', otherSpellings: [] },
  ]);
});
