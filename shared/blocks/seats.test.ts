import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blockOf } from '../../tests/factories/source-blocks.ts';
import type { ConnectorBlock } from './block.ts';
import { cavitiesOutside, cavityNames, seatsOf } from './seats.ts';

function connector(layout: string, first: string | null, cavities: readonly string[]): ConnectorBlock {
  const attributes = `layout="${layout}" seen="wire side"${first === null ? '' : ` first="${first}"`}`;
  const rows = cavities.map((cavity) => `| ${cavity} | Y |`);
  return blockOf(
    'connector',
    [`:::connector{#plug ${attributes}}`, '| Cavity | Wire |', '| - | - |', ...rows, ':::'].join('\n'),
  ).block;
}

/** The face as one sees it: each row's cavities from left to right. */
function face(block: ConnectorBlock): readonly string[] {
  const rows: string[][] = [];
  for (const { cavity, place } of seatsOf(block)) {
    if (place.kind !== 'rows') continue;
    const row = (rows[place.row] ??= []);
    row[place.column] = cavity ?? '?';
  }
  return rows.map((row) => Array.from(row, (cavity) => cavity ?? '.').join(' '));
}

describe('seatsOf', () => {
  const six = ['1', '2', '3', '4', '5', '6'];

  it('counts row by row from the first corner', () => {
    expect(face(connector('2x3', 'top left', six))).toEqual(['1 2 3', '4 5 6']);
    expect(face(connector('2x3', 'top right', six))).toEqual(['3 2 1', '6 5 4']);
    expect(face(connector('2x3', 'bottom left', six))).toEqual(['4 5 6', '1 2 3']);
    expect(face(connector('2x3', 'bottom right', six))).toEqual(['6 5 4', '3 2 1']);
  });

  it('counts in reading order where nobody says which is the first', () => {
    expect(face(connector('3+4', null, [...six, '7']))).toEqual(['1 2 3', '4 5 6 7']);
  });

  it('passes over gaps', () => {
    expect(face(connector('xx.xx+xxxxx', 'top right', six))).toEqual(['4 3 . 2 1', '9 8 7 6 5']);
  });

  it('seats numbers by their number, so rows may stand in any order or be missing', () => {
    expect(face(connector('2x2', 'top left', ['4', '1']))).toEqual(['1 2', '3 4']);
  });

  it('seats names in the order of the table, and leaves the rest without a name', () => {
    expect(face(connector('2x2', 'top left', ['C', 'A', 'B+']))).toEqual(['C A', 'B+ ?']);
  });

  it('goes round a ring clockwise from the first corner, or from the top', () => {
    const degrees = (first: string | null): readonly (number | null)[] =>
      seatsOf(connector('round 4', first, ['1'])).map(({ place }) => (place.kind === 'ring' ? place.degrees : null));
    expect(degrees(null)).toEqual([0, 90, 180, 270]);
    expect(degrees('top left')).toEqual([315, 45, 135, 225]);
    expect(degrees('bottom right')).toEqual([135, 225, 315, 45]);
  });

  it('numbers every seat once, each in a place of its own, whatever the corner', () => {
    const corner = fc.constantFrom(null, 'top left', 'top right', 'bottom left', 'bottom right');
    const layout = fc.stringMatching(/^[x.]{1,6}x(\+[x.]{1,6}){0,3}$/);
    fc.assert(
      fc.property(layout, corner, (written, first) => {
        const seats = seatsOf(connector(written, first, ['1']));
        expect(seats.map(({ number }) => number)).toEqual(Array.from(seats, (_, at) => at + 1));
        expect(new Set(seats.map(({ place }) => JSON.stringify(place))).size).toBe(seats.length);
        expect(seats).toHaveLength(written.replace(/[^x]/g, '').length);
      }),
    );
  });
});

describe('cavitiesOutside', () => {
  it('names numbers beyond the face, and names beyond its seats', () => {
    expect(cavitiesOutside(connector('2', null, ['1', '2', '3', '0']))).toEqual(['3', '0']);
    expect(cavitiesOutside(connector('2', null, ['A', 'B', 'C']))).toEqual(['C']);
    expect(cavitiesOutside(connector('2', null, ['2', '2+']))).toEqual([]);
  });
});

describe('cavityNames', () => {
  it('has each cavity once, however many wires it holds', () => {
    expect(cavityNames(connector('3', null, ['1', '2', '2+', '2++']))).toEqual(['1', '2']);
  });
});
