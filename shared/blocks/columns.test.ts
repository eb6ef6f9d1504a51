import { describe, expect, it } from 'vitest';
import { cellOf, commonHeadings, readColumns, wireHeadings } from './columns.ts';

const headings = { cavity: ['cavity', 'pin'], ...wireHeadings, ...commonHeadings };

describe('readColumns', () => {
  it('knows a column by any of its headings, in any order and case', () => {
    const roles = readColumns(['NOTE', 'Pin', 'Color', 'mm²', 'Signal', ' **Years** '], headings).map(
      ({ role }) => role,
    );
    expect(roles).toEqual(['note', 'cavity', 'wire', 'size', 'circuit', 'years']);
  });

  it.each(['Wire', 'Colour', 'Color'])('takes %s for the wire', (heading) => {
    expect(readColumns([heading], headings)[0]?.role).toBe('wire');
  });

  it.each(['mm²', 'mm2', 'Size'])('takes %s for the size', (heading) => {
    expect(readColumns([heading], headings)[0]?.role).toBe('size');
  });

  it.each(['Circuit', 'Signal', 'Function'])('takes %s for the circuit', (heading) => {
    expect(readColumns([heading], headings)[0]?.role).toBe('circuit');
  });

  it('keeps a column that it does not know, and the second of two with one meaning', () => {
    expect(readColumns(['Torque', 'Wire', 'Colour', ''], headings)).toEqual([
      { heading: 'Torque', role: null },
      { heading: 'Wire', role: 'wire' },
      { heading: 'Colour', role: null },
      { heading: '', role: null },
    ]);
  });
});

describe('cellOf', () => {
  it('gives a row its cell in the column of a role, and nothing where there is none', () => {
    const columns = readColumns(['Wire', 'Cavity'], headings);
    const row = { cells: ['Y/R', '2'], line: 3 };
    expect(cellOf(columns, row, 'cavity')).toBe('2');
    expect(cellOf(columns, row, 'note')).toBe('');
  });
});
