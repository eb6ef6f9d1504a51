import { describe, expect, it } from 'vitest';
import { connectorOf } from '../../tests/factories/connectors.ts';
import { anyVariant } from '../pages/applicability.ts';
import { faceOf } from './face.ts';

const variant = { year: 1980, market: null, frame: null };

describe('The face of a connector', () => {
  it('has a seat for every cavity of its layout, in the order of their numbers', () => {
    const face = faceOf(connectorOf({ layout: '2x3', seen: 'wire side', first: 'top left' }, ['| 1 | B |', '| 5 | Y/R |']), anyVariant);
    expect(face.seats.map(({ number, cavity, state }) => [number, cavity, state])).toEqual([
      [1, '1', 'wired'],
      [2, '2', 'unwritten'],
      [3, '3', 'unwritten'],
      [4, '4', 'unwritten'],
      [5, '5', 'wired'],
      [6, '6', 'unwritten'],
    ]);
    expect(face.seats[4]?.wires).toEqual([{ colours: [{ base: 'yellow', tracer: 'red' }], code: 'Y/R' }]);
  });

  it('is not oriented where nothing says where the first cavity is', () => {
    const rows = ['| 1 | B |'];
    expect(faceOf(connectorOf({ layout: '1', seen: 'wire side', first: 'top left' }, rows), anyVariant).oriented).toBe(true);
    expect(faceOf(connectorOf({ layout: '1', seen: 'wire side', latch: 'top' }, rows), anyVariant).oriented).toBe(false);
  });

  it('tells wires that share a cavity from wires of different years', () => {
    const face = faceOf(
      connectorOf({ layout: '3', seen: 'wire side', first: 'top left' }, [
        '| 1 | B | Earth |',
        '| 1+ | B | Second earth |',
        '| 2 | L | Main beam | | -1979 |',
        '| 2 | Y | Main beam | | 1980- |',
        '| 3 | W | Dip beam | | -1979 |',
        '| 3 | W | Dip beam | | 1980- |',
      ]),
      anyVariant,
    );
    expect(face.seats.map(({ wires, either }) => [wires.map(({ code }) => code), either])).toEqual([
      [['B', 'B'], false],
      [['L', 'Y'], true],
      [['W'], false],
    ]);
  });

  it('shows only the wires of the bike that was chosen', () => {
    const connector = connectorOf({ layout: '2', seen: 'wire side', first: 'top left' }, [
      '| 1 | L | Main beam | | -1979 |',
      '| 1 | Y | Main beam | | 1980- |',
      '| 2 | G | Old lamp | | -1979 |',
    ]);
    const [first, second] = faceOf(connector, variant).seats;
    expect(first?.wires.map(({ code }) => code)).toEqual(['Y']);
    expect(first?.either).toBe(false);
    expect(second?.state).toBe('set back');
    expect(second?.wires).toEqual([]);
  });

  it('knows empty, capped and further cavities', () => {
    const face = faceOf(
      connectorOf({ layout: '4', seen: 'wire side', first: 'top left' }, [
        '| 1 | – |',
        '| 2 | R | Spare feed | capped |',
        '| 3 | B |',
        '| 3+ | G |',
        '| 3++ | W |',
        '| 4 | QQ |',
      ]),
      anyVariant,
    );
    expect(face.seats.map(({ state }) => state)).toEqual(['blank', 'capped', 'wired', 'wired']);
    expect(face.seats[2]).toMatchObject({ wires: [{ code: 'B' }, { code: 'G' }], more: true });
    expect(face.seats[3]?.wires).toEqual([{ colours: [], code: 'QQ' }]);
  });

  it('keeps both readings of letters that read as one colour and as two', () => {
    const [seat] = faceOf(connectorOf({ layout: '1', seen: 'wire side', first: 'top left' }, ['| 1 | BR |']), anyVariant).seats;
    expect(seat?.wires[0]?.colours).toEqual([
      { base: 'brown', tracer: null },
      { base: 'black', tracer: 'red' },
    ]);
    expect(seat?.words).toBe('cavity 1, brown or black, red tracer');
  });

  it('says each cavity in words', () => {
    const face = faceOf(
      connectorOf({ layout: '5', seen: 'wire side', first: 'top left' }, [
        '| 1 | Y/R | Main beam |',
        '| 2 | – | blank |',
        '| 3 | L | Dip beam | | 1978-1979 |',
        '| 3 | W | Dip beam | | | UK |',
        '| 4 | R | Spare feed | capped |',
      ]),
      anyVariant,
    );
    expect(face.seats.map(({ words }) => words)).toEqual([
      'cavity 1, yellow, red tracer, main beam',
      'cavity 2, empty',
      'cavity 3, blue, dip beam, 1978 to 1979; white, dip beam, UK only',
      'cavity 4, red, spare feed, capped',
      'cavity 5, not written down',
    ]);
  });
});
