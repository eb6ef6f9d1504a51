import { describe, expect, it } from 'vitest';
import { appliesToAll, type Applicability } from './applicability.ts';
import { addressSuffix, applicabilityWords } from './applicability-words.ts';
import { readApplicability } from './read-applicability.ts';

function holdsFor(years: string, markets = '', frames = ''): Applicability {
  return readApplicability({ years, markets, frames }).applies;
}

describe('applicabilityWords', () => {
  it('says nothing of what holds for all', () => {
    expect(applicabilityWords(appliesToAll)).toBeNull();
  });

  it.each([
    ['1978-1979', '', '', '1978 to 1979'],
    ['1980-', '', '', 'from 1980'],
    ['-1979', '', '', 'up to 1979'],
    ['1978, 1980-', '', '', '1978 and from 1980'],
    ['1980-', 'UK, EU', '', 'from 1980, UK and EU only'],
    ['', '', 'F1', 'frame F1'],
    ['', '', 'F1, F2, F3', 'frames F1, F2 and F3'],
  ])('of %j, %j, %j says %s', (years, markets, frames, words) => {
    expect(applicabilityWords(holdsFor(years, markets, frames))).toBe(words);
  });
});

describe('addressSuffix', () => {
  it.each([
    ['', '', '', ''],
    ['1980-', '', '', '~1980-'],
    ['1978-1979', '', '', '~1978-1979'],
    ['', 'UK', '', '~~UK'],
    ['', '', 'F1', '~~~F1'],
    ['1980-', 'UK, EU', '', '~1980-~UK,EU'],
    ['1980-', '', 'F1', '~1980-~~F1'],
    ['', 'South Africa', '', '~~South-Africa'],
  ])('of %j, %j, %j is %j', (years, markets, frames, suffix) => {
    expect(addressSuffix(holdsFor(years, markets, frames))).toBe(suffix);
  });
});
