import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyVariant, appliesToAll, type Applicability } from './applicability.ts';
import { readApplicability } from './read-applicability.ts';
import { appliesTo, areDisjoint, choicesOf, parseVariant } from './variant.ts';

function holdsFor(years: string, markets = '', frames = ''): Applicability {
  return readApplicability({ years, markets, frames }).applies;
}

describe('parseVariant', () => {
  it('reads what an address says, and chooses nothing where it says nothing', () => {
    expect(parseVariant({ year: '1980', market: ' UK ', frame: '' })).toEqual({
      year: 1980,
      market: 'UK',
      frame: null,
    });
    expect(parseVariant({})).toEqual(anyVariant);
  });

  it.each(['', 'late', '80', '1980.5', '0000', '-1980', '99999'])('chooses no year of %j', (year) => {
    expect(parseVariant({ year }).year).toBeNull();
  });
});

describe('appliesTo', () => {
  const bike = { year: 1979, market: 'UK', frame: 'F1' };

  it('rules nothing out where the reader has chosen nothing, or the line holds for all', () => {
    expect(appliesTo(holdsFor('1980-', 'EU', 'F2'), anyVariant)).toEqual({ applies: true });
    expect(appliesTo(appliesToAll, bike)).toEqual({ applies: true });
  });

  it('counts both ends of a span, and names of markets and frames in any case', () => {
    expect(appliesTo(holdsFor('1979-1980', 'uk', 'f1'), bike)).toEqual({ applies: true });
    expect(appliesTo(holdsFor('-1979'), bike)).toEqual({ applies: true });
  });

  it('says why not: years first, then market, then frame', () => {
    expect(appliesTo(holdsFor('1980-', 'EU'), bike)).toEqual({ applies: false, why: 'from 1980, not 1979' });
    expect(appliesTo(holdsFor('', 'EU, US', 'F2'), bike)).toEqual({ applies: false, why: 'EU, US, not UK' });
    expect(appliesTo(holdsFor('', '', 'F2'), bike)).toEqual({ applies: false, why: 'frame F2, not F1' });
  });
});

describe('areDisjoint', () => {
  it.each([
    ['1978-1979', '1980-', true],
    ['1978-1980', '1980-', false],
    ['1978, 1982', '1979-1981', true],
    ['', '1980-', false],
  ])('of the years %j and %j is %s', (a, b, disjoint) => {
    expect(areDisjoint(holdsFor(a), holdsFor(b))).toBe(disjoint);
  });

  it('needs no bike in common in any one way: different markets are enough for the same years', () => {
    expect(areDisjoint(holdsFor('1980', 'UK'), holdsFor('1980', 'EU, US'))).toBe(true);
    expect(areDisjoint(holdsFor('1980', 'UK'), holdsFor('1980', 'EU, uk'))).toBe(false);
    expect(areDisjoint(holdsFor('', '', 'F1'), holdsFor('', '', 'F2'))).toBe(true);
  });

  it('agrees with asking every bike whether both hold', () => {
    const years = fc.constantFrom('', '1978', '1978-1980', '1980-', '-1979', '1978, 1981');
    const markets = fc.constantFrom('', 'UK', 'EU', 'UK, EU');
    const applicability = fc.tuple(years, markets).map(([y, m]) => holdsFor(y, m));
    const bikes = [1975, 1976, 1977, 1978, 1979, 1980, 1981, 1982].flatMap((year) =>
      ['UK', 'EU', 'US'].map((market) => ({ year, market, frame: null })),
    );
    fc.assert(
      fc.property(applicability, applicability, (a, b) => {
        const meet = bikes.some((bike) => appliesTo(a, bike).applies && appliesTo(b, bike).applies);
        expect(areDisjoint(a, b)).toBe(!meet);
        expect(areDisjoint(b, a)).toBe(areDisjoint(a, b));
      }),
    );
  });
});

describe('choicesOf', () => {
  it('spans all years that are named, and lists markets and frames once, in order', () => {
    expect(choicesOf([holdsFor('1980-', 'UK'), holdsFor('1978-1979', 'EU, uk', 'F2'), holdsFor('', '', 'F1')])).toEqual(
      {
        years: { from: 1978, to: 1980 },
        markets: ['EU', 'UK'],
        frames: ['F1', 'F2'],
      },
    );
  });

  it('offers nothing where everything holds for all', () => {
    expect(choicesOf([appliesToAll, appliesToAll])).toEqual({ years: null, markets: [], frames: [] });
    expect(choicesOf([])).toEqual({ years: null, markets: [], frames: [] });
  });
});
