import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { packNumbers, unpackNumbers } from './packed-numbers.ts';
import { packStrings, unpackStrings } from './packed-strings.ts';
import { asRecent, fromRecent } from './recent-values.ts';

describe('packed columns', () => {
  test('of numbers come back as they were', () => {
    fc.assert(
      fc.property(fc.array(fc.nat(1_000_000)), (numbers) => {
        expect([...unpackNumbers(packNumbers(numbers), numbers.length)]).toEqual(numbers);
      }),
    );
  });

  test('of one repeated number are one character a place', () => {
    expect(packNumbers([7, 7, 7, 7]).join('')).toHaveLength(1);
    expect([...unpackNumbers(packNumbers([100, 100, 100]), 3)]).toEqual([100, 100, 100]);
  });

  test('hold nothing that JSON must escape', () => {
    const packed = packNumbers(Array.from({ length: 300 }, (_, number) => number));
    expect(JSON.stringify(packed).length).toBe(packed.join('').length + 2 + packed.length * 3 - 1);
  });

  test('of texts come back with their breaks as spaces', () => {
    const texts = fc.array(fc.string({ unit: fc.constantFrom('a', 'b', ' ', '\n', 'é') }));
    fc.assert(
      fc.property(texts, (written) => {
        const column = unpackStrings(packStrings(written, ['']), written.length);
        expect(written.map((_, at) => column.values[column.places[at] ?? 0])).toEqual(
          written.map((text) => text.replace(/\s+/g, ' ').trim()),
        );
      }),
    );
  });

  test('of what changed in its context come back', () => {
    const pairs = fc.array(fc.tuple(fc.nat(5), fc.nat(3)));
    fc.assert(
      fc.property(pairs, (written) => {
        const numbers = written.map(([number]) => number);
        const contexts = written.map(([, context]) => context);
        expect([...fromRecent(Uint32Array.from(asRecent(numbers, contexts)), contexts)]).toEqual(numbers);
      }),
    );
  });
});
