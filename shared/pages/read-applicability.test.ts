import { expect, it } from 'vitest';
import { readApplicability } from './read-applicability.ts';

it('holds for all where nothing, a dash or "all" is written', () => {
  for (const nothing of ['', ' ', '–', '-', 'all', null]) {
    expect(readApplicability({ years: nothing, markets: nothing, frames: nothing })).toEqual({
      applies: { years: [], markets: [], frames: [] },
      unreadableYears: null,
    });
  }
});

it('reads names as written, each once whatever its case', () => {
  expect(readApplicability({ markets: 'UK, EU/uk', frames: 'F 100;  F 200' }).applies).toEqual({
    years: [],
    markets: ['UK', 'EU'],
    frames: ['F 100', 'F 200'],
  });
});

it('gives back years that cannot be read, and holds for all of them', () => {
  expect(readApplicability({ years: 'late' })).toEqual({
    applies: { years: [], markets: [], frames: [] },
    unreadableYears: 'late',
  });
});
