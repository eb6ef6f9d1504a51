import { describe, expect, it } from 'vitest';
import { colourCodes } from '../../shared/wire-colours/colour-codes.ts';
import type { ColourName, ColourSystemName, WireColour } from '../../shared/wire-colours/colour-system.ts';
import { coloursInAnySystem } from '../../shared/wire-colours/colours-in-any-system.ts';
import { readWireColour } from '../../shared/wire-colours/read-wire-colour.ts';

type PublishedSystem = Exclude<ColourSystemName, 'own'>;

function reads(code: string, system: PublishedSystem): WireColour | null {
  const reading = readWireColour(code, { name: system });
  return reading.kind === 'read' ? reading.colour : null;
}

function plain(base: ColourName): WireColour {
  return { base, tracer: null };
}

/* IEC 60757:1983, its table of codes (as adopted in GOST 28763-90). */
const iec60757: readonly (readonly [string, ColourName])[] = [
  ['BK', 'black'],
  ['BN', 'brown'],
  ['RD', 'red'],
  ['OG', 'orange'],
  ['YE', 'yellow'],
  ['GN', 'green'],
  ['BU', 'blue'],
  ['VT', 'violet'],
  ['GY', 'grey'],
  ['WH', 'white'],
  ['PK', 'pink'],
  ['GD', 'gold'],
  ['TQ', 'turquoise'],
  ['SR', 'silver'],
];

describe('IEC 60757', () => {
  it.each(iec60757)('%s is %s, and in lower case the same (1983 edition)', (code, colour) => {
    expect(reads(code, 'iec')).toEqual(plain(colour));
    expect(reads(code.toLowerCase(), 'iec')).toEqual(plain(colour));
  });

  it('has no other code of one colour', () => {
    expect(colourCodes('iec').map(({ code, colour }) => [code, colour])).toEqual(iec60757);
  });

  it('has GNYE for green and yellow', () => {
    expect(reads('GNYE', 'iec')).toEqual({ base: 'green', tracer: 'yellow' });
  });

  it('spells blue BU and orange OG, where DIN 72551-7 has BL and OR', () => {
    expect(reads('BL', 'iec')).toBeNull();
    expect(reads('OR', 'iec')).toBeNull();
    expect(reads('BL', 'din')).toEqual(plain('blue'));
    expect(reads('OR', 'din')).toEqual(plain('orange'));
  });
});

describe("DIN 72551-7, by DIN's own article on it", () => {
  it('puts the base first: BLGN is another wire than GNBL', () => {
    expect(reads('BLGN', 'din')).toEqual({ base: 'blue', tracer: 'green' });
    expect(reads('GNBL', 'din')).toEqual({ base: 'green', tracer: 'blue' });
  });

  it('tells apart the two that the article calls hard to tell apart', () => {
    expect(reads('RDBN', 'din')).toEqual({ base: 'red', tracer: 'brown' });
    expect(reads('RDOR', 'din')).toEqual({ base: 'red', tracer: 'orange' });
  });
});

/* Older DIN 72551 practice: two makes' enthusiasts' pages that list the German abbreviations. Red has two spellings. */
const olderGerman: readonly (readonly [string, ColourName])[] = [
  ['sw', 'black'],
  ['ws', 'white'],
  ['br', 'brown'],
  ['rt', 'red'],
  ['ro', 'red'],
  ['gr', 'grey'],
  ['ge', 'yellow'],
  ['gn', 'green'],
  ['hb', 'light blue'],
  ['li', 'violet'],
];

describe('older German abbreviations', () => {
  it.each(olderGerman)('%s is %s', (code, colour) => {
    expect(reads(code, 'din')).toEqual(plain(colour));
  });

  it('are joined by a stroke, base first: sw/ws is the left indicator, sw/gn the right', () => {
    expect(reads('sw/ws', 'din')).toEqual({ base: 'black', tracer: 'white' });
    expect(reads('sw/gn', 'din')).toEqual({ base: 'black', tracer: 'green' });
  });
});

/* BS-AU7: read in a club's copy of the standard's letters. K, LG, O and Y are recalled, so nothing here hangs on them. */
const bsAu7: readonly (readonly [string, ColourName])[] = [
  ['B', 'black'],
  ['U', 'blue'],
  ['N', 'brown'],
  ['R', 'red'],
  ['P', 'violet'],
  ['G', 'green'],
  ['S', 'grey'],
  ['W', 'white'],
];

describe('BS-AU7', () => {
  it.each(bsAu7)('%s is %s', (code, colour) => {
    expect(reads(code, 'bs-au7')).toEqual(plain(colour));
  });

  it('puts main before tracer: WG is white with green', () => {
    expect(reads('WG', 'bs-au7')).toEqual({ base: 'white', tracer: 'green' });
  });
});

/*
 * Japanese letters: recalled from lists in the manner of JASO D 607; no single published source. The list is held to be
 * ours, so that a change of it is noticed; no figure of anybody else hangs on it.
 */
const japanese: readonly (readonly [string, ColourName])[] = [
  ['B', 'black'],
  ['Br', 'brown'],
  ['Ch', 'chocolate'],
  ['Dg', 'dark green'],
  ['G', 'green'],
  ['Gr', 'grey'],
  ['L', 'blue'],
  ['Lg', 'light green'],
  ['O', 'orange'],
  ['P', 'pink'],
  ['R', 'red'],
  ['Sb', 'light blue'],
  ['V', 'violet'],
  ['W', 'white'],
  ['Y', 'yellow'],
];

describe('Japanese letters', () => {
  it.each(japanese)('%s is %s', (code, colour) => {
    expect(reads(code, 'jis')).toEqual(plain(colour));
  });

  /* Base before stripe, written Y/R, YR or Y-R: common practice, Japanese, German and British alike. */
  it.each(['Y/R', 'YR', 'Y-R'])('%s is yellow with a red stripe', (written) => {
    expect(reads(written, 'jis')).toEqual({ base: 'yellow', tracer: 'red' });
  });

  it('has three codes that joined capitals also spell as two colours, and no more', () => {
    const joined = japanese
      .flatMap(([a]) => japanese.map(([b]) => `${a}${b}`.toUpperCase()))
      .filter((code) => code.length === 2);
    const ambiguous = joined.filter((code) => readWireColour(code, { name: 'jis' }).kind === 'ambiguous');
    expect(ambiguous.toSorted()).toEqual(['BR', 'GR', 'LG']);
  });
});

/* Clashes between the systems above: one spelling, several colours. Computed by comparing the tables. */
describe('spellings that clash', () => {
  it.each([
    ['P', 'jis', 'pink', 'bs-au7', 'violet'],
    ['BR', 'din', 'brown', 'bs-au7', 'black'],
    ['GR', 'din', 'grey', 'bs-au7', 'green'],
    ['BL', 'din', 'blue', 'jis', 'black'],
  ] as const)('%s in %s begins with %s, in %s with %s', (code, one, colourInOne, other, colourInOther) => {
    expect(reads(code, one)?.base).toBe(colourInOne);
    expect(reads(code, other)?.base).toBe(colourInOther);
  });

  it('are all looked for where nobody says which system: BR is brown, and black with red', () => {
    expect(coloursInAnySystem('BR')).toEqual([plain('brown'), { base: 'black', tracer: 'red' }]);
  });

  it('G alone is green to the Japanese and the British, and nothing to IEC', () => {
    expect(reads('G', 'jis')).toEqual(plain('green'));
    expect(reads('G', 'bs-au7')).toEqual(plain('green'));
    expect(reads('G', 'iec')).toBeNull();
  });
});
