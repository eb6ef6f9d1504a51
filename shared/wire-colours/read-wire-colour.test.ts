import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { colourCodes } from './colour-codes.ts';
import type { ColourReading, ColourSystem, WireColour } from './colour-system.ts';
import { wireColourWords } from './colour-words.ts';
import { readWireColour } from './read-wire-colour.ts';
import { wireColourCode } from './write-wire-colour.ts';

const jis: ColourSystem = { name: 'jis' };
const published: readonly ColourSystem[] = [jis, { name: 'din' }, { name: 'bs-au7' }, { name: 'iec' }];
const yellowRed: WireColour = { base: 'yellow', tracer: 'red' };

function read(base: WireColour['base'], tracer: WireColour['tracer'] = null): ColourReading {
  return { kind: 'read', colour: { base, tracer } };
}

describe('readWireColour', () => {
  it.each([
    'Y/R',
    'YR',
    'Y-R',
    'Y R',
    'Y\\R',
    'Y / R',
    'y/r',
    'yr',
    'yellow/red',
    'yellow-red',
    'Yellow Red',
    'yellow with a red stripe',
    'yellow, red tracer',
    'red stripe on yellow',
    'yellow/R',
  ])('reads %j as yellow with a red tracer', (written) => {
    expect(readWireColour(written, jis)).toEqual({ kind: 'read', colour: yellowRed });
  });

  it('reads words in every system, and colours of two words', () => {
    for (const system of published) {
      expect(readWireColour('light green/red', system)).toEqual(read('light green', 'red'));
      expect(readWireColour('dark green', system)).toEqual(read('dark green'));
      expect(readWireColour('gray', system)).toEqual(read('grey'));
    }
  });

  it('never settles joined capitals that spell one colour and two, the one colour first', () => {
    expect(readWireColour('BR', jis)).toEqual({
      kind: 'ambiguous',
      colour: { base: 'brown', tracer: null },
      others: [{ base: 'black', tracer: 'red' }],
    });
    expect(readWireColour('GR', jis).kind).toBe('ambiguous');
    expect(readWireColour('LG', jis).kind).toBe('ambiguous');
    expect(readWireColour('br', jis).kind).toBe('ambiguous');
    expect(readWireColour('LGR', jis)).toMatchObject({
      kind: 'ambiguous',
      colour: { base: 'blue', tracer: 'grey' },
      others: [{ base: 'light green', tracer: 'red' }],
    });
  });

  it('settles them by a stroke, or by the exact case of the code', () => {
    expect(readWireColour('B/R', jis)).toEqual(read('black', 'red'));
    expect(readWireColour('Br', jis)).toEqual(read('brown'));
    expect(readWireColour('Lg', jis)).toEqual(read('light green'));
    expect(readWireColour('LgR', jis)).toEqual(read('light green', 'red'));
    expect(readWireColour('LGr', jis)).toEqual(read('blue', 'grey'));
    expect(readWireColour('BR/W', jis)).toEqual(read('brown', 'white'));
  });

  it('takes a capital with a small letter for one code, so Lb is not blue with black', () => {
    expect(readWireColour('Lb', jis)).toEqual({ kind: 'unknown' });
  });

  it('does not mind case where the system has none of its own', () => {
    expect(readWireColour('blgn', { name: 'din' })).toEqual(read('blue', 'green'));
    expect(readWireColour('Sw/Rt', { name: 'din' })).toEqual(read('black', 'red'));
    expect(readWireColour('gnye', { name: 'iec' })).toEqual(read('green', 'yellow'));
    expect(readWireColour('lg', { name: 'bs-au7' })).toEqual(read('light green'));
  });

  it('reads the first of joined IEC codes as base, with a stroke or without', () => {
    expect(readWireColour('BURD', { name: 'iec' })).toEqual(read('blue', 'red'));
    expect(readWireColour('BU/RD', { name: 'iec' })).toEqual(read('blue', 'red'));
  });

  it("reads a page's own key before anything else", () => {
    const own: ColourSystem = { name: 'own', key: { B: 'white', N: 'black', BN: 'violet' } };
    expect(readWireColour('B', own)).toEqual(read('white'));
    expect(readWireColour('N/B', own)).toEqual(read('black', 'white'));
    expect(readWireColour('BN', own)).toMatchObject({ kind: 'ambiguous', colour: { base: 'violet' } });
    expect(readWireColour('R', own)).toEqual({ kind: 'unknown' });
  });

  it.each(['', 'Z', 'Y/Z', 'Y/R/B', 'Y/Y', '/', 'yellow or red', 'with a stripe', 'x'.repeat(5000)])(
    'knows no colour in %j',
    (written) => {
      expect(readWireColour(written, jis)).toEqual({ kind: 'unknown' });
    },
  );

  it('reads back what each system writes, and the words', () => {
    const anyWire = fc.constantFrom(...published).chain((system) => {
      const colours = colourCodes(system.name).map(({ colour }) => colour);
      return fc.record({
        system: fc.constant(system),
        base: fc.constantFrom(...colours),
        tracer: fc.option(fc.constantFrom(...colours)),
      });
    });
    fc.assert(
      fc.property(anyWire, ({ system, base, tracer }) => {
        fc.pre(base !== tracer);
        const colour = { base, tracer };
        expect(readWireColour(wireColourCode(colour, system), system)).toEqual({ kind: 'read', colour });
        expect(readWireColour(wireColourWords(colour), system)).toEqual({ kind: 'read', colour });
      }),
    );
  });

  it('never throws, whatever is written', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.constantFrom(...published), (written, system) => {
        expect(['read', 'ambiguous', 'unknown']).toContain(readWireColour(written, system).kind);
      }),
    );
  });
});
