import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readQuery, type QueryTerm } from './read-query.ts';

function termsOf(text: string): readonly QueryTerm[] {
  return readQuery(text).terms;
}

/** A term in a few words, as the reading of a query is talked about. */
function shortly(term: QueryTerm): string {
  switch (term.kind) {
    case 'colour':
      return `colour ${term.colours.map(({ base, tracer }) => `${base}/${String(tracer)}`).join(' or ')}`;
    case 'cavity':
      return term.of === null ? `cavity ${term.name}` : `cavity ${term.of}.${term.name}`;
    case 'number':
      return `number ${term.name}`;
    case 'size':
      return `size ${String(term.squareMillimetres)}`;
    case 'word':
      return `word ${term.written}`;
    case 'no-colour':
      return `no colour ${term.written}`;
  }
}

const yellowRed = 'colour yellow/red';

describe('a query', () => {
  test.each([
    'Y/R',
    'YR',
    'yr',
    'y-r',
    'Y\\R',
    'y r',
    'yellow red',
    'yellow/red',
    'Yellow, red tracer',
    'yellow with a red stripe',
    'yellow and red',
    'red stripe on yellow',
    'yellow wire with a thin red tracer',
    'ge/rt',
    'ge/ro',
    'gelb rot',
    'gelb/rot',
    'YERD',
    'ye/rd',
  ])('says one wire by %s', (written) => {
    expect(termsOf(written).map(shortly)).toEqual([yellowRed]);
  });

  test.each([
    ['yellow', ['colour yellow/any']],
    ['Y', ['colour yellow/null']],
    ['red tracer', ['colour any/red']],
    ['light green', ['colour light green/any']],
    ['sky blue', ['colour light blue/any']],
    ['tail light green', ['word tail light', 'colour green/any']],
    ['BR', ['colour brown/null or black/red']],
    ['schwarz weiß', ['colour black/white']],
    ['Y/Q', ['no colour Y/Q']],
  ])('reads the colours of “%s”', (written, terms) => {
    expect(termsOf(written).map(shortly)).toEqual(terms);
  });

  test.each([
    ['headlight cavity 3', ['word headlight', 'cavity 3']],
    ['pin 3 headlight', ['cavity 3', 'word headlight']],
    ['headlight pin no 3', ['word headlight', 'cavity 3']],
    ['headlight 3', ['word headlight', 'number 3']],
    ['headlight.3', ['word headlight', 'cavity headlight.3']],
    ['headlight.2+', ['word headlight', 'cavity headlight.2+']],
    ['dip-switch.HI', ['word dip switch', 'cavity dip-switch.hi']],
    ['donors/qf550/pinouts#headlight.3', ['word donor', 'number qf550', 'word headlight', 'cavity headlight.3']],
    ['relay 86', ['word relay', 'number 86']],
    ['30 A fuse', ['number 30', 'word fuse']],
    ['0.85 mm² yellow', ['size 0.85', 'colour yellow/any']],
  ])('reads the cavities and numbers of “%s”', (written, terms) => {
    expect(termsOf(written).map(shortly)).toEqual(terms);
  });

  test.each([
    ['where does the turn signal wire go', ['word turn signal']],
    ['how do I find the earth strap', ['word earth strap']],
    ['l-h indicator', ['word l h', 'word indicator']],
    ['qf-550', ['word qf', 'number 550']],
    ['connector', ['word connector']],
    ['', []],
  ])('keeps what is asked for of “%s”', (written, terms) => {
    expect(termsOf(written).map(shortly)).toEqual(terms);
  });

  test('may name a model year', () => {
    expect(readQuery('headlamp earth 1960')).toMatchObject({ year: { year: 1960 } });
    expect(readQuery('kestova 360').year).toBeNull();
  });

  test('is read the same with a space behind it but for the last word, which is then finished', () => {
    expect(termsOf('head')).toMatchObject([{ last: true }]);
    expect(termsOf('head ')).toMatchObject([{ last: false }]);
  });

  test('never throws, whatever is typed', () => {
    const noise = fc.oneof(
      fc.string({ unit: 'grapheme', maxLength: 400 }),
      fc
        .array(
          fc.constantFrom(
            'yellow',
            'Y/R',
            '/',
            '-',
            'with',
            'a',
            'pin',
            '3',
            '3+',
            'on',
            'stripe',
            'headlight.',
            '.',
            '#',
            '~',
            'light',
            'mm',
            '1979',
          ),
        )
        .map((words) => words.join(' ')),
    );
    fc.assert(
      fc.property(noise, (text) => {
        expect(readQuery(text).terms.length).toBeLessThanOrEqual(14);
      }),
      { numRuns: 500 },
    );
  });
});
