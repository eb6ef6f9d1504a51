import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readRating } from './read-rating.ts';

const nothing = { volts: null, amps: null, blow: false, watts: null, ohms: null, ampHours: null, feeds: [] };

describe('readRating', () => {
  it.each([
    ['35 A blow', { amps: 35, blow: true }],
    ['35A (blow)', { amps: 35, blow: true }],
    ['20 A', { amps: 20 }],
    ['500 mA', { amps: 0.5 }],
    ['12 V 8 Ah LiFePO4', { volts: 12, ampHours: 8 }],
    ['30 W', { watts: 30 }],
    ['12V, 21W', { volts: 12, watts: 21 }],
    ['2 x 21 W', { watts: 42 }],
    ['12 V 4 Ω', { volts: 12, ohms: 4 }],
    ['4,5 Ω', { ohms: 4.5 }],
    ['4.5 ohms', { ohms: 4.5 }],
    ['5 kΩ', { ohms: 5000 }],
    ['4 \u2126', { written: '4 Ω', ohms: 4 }],
    ['tail 5 W', { watts: 5 }],
    ['as fitted', {}],
  ])('reads %j', (written, figures) => {
    expect(readRating(written)).toEqual({ written, ...nothing, ...figures });
  });

  it.each([
    [
      'dip 55 W, main 60 W',
      null,
      [
        { name: 'dip', watts: 55, amps: null },
        { name: 'main', watts: 60, amps: null },
      ],
    ],
    [
      '12 V dip 55 W, main 60 W',
      12,
      [
        { name: 'dip', watts: 55, amps: null },
        { name: 'main', watts: 60, amps: null },
      ],
    ],
    [
      '12 V, main/dip 60/55 W',
      12,
      [
        { name: 'main', watts: 60, amps: null },
        { name: 'dip', watts: 55, amps: null },
      ],
    ],
    [
      'tail lamp 5 W; stop lamp 21 W',
      null,
      [
        { name: 'tail-lamp', watts: 5, amps: null },
        { name: 'stop-lamp', watts: 21, amps: null },
      ],
    ],
    [
      'low 2,5 A, high 5 A',
      null,
      [
        { name: 'low', watts: null, amps: 2.5 },
        { name: 'high', watts: null, amps: 5 },
      ],
    ],
    [
      '12 V 35/35 W',
      12,
      [
        { name: '1', watts: 35, amps: null },
        { name: '2', watts: 35, amps: null },
      ],
    ],
  ])('names the feeds of %j', (written, volts, feeds) => {
    expect(readRating(written)).toEqual({ written, ...nothing, volts, feeds });
  });

  it('takes the continuous current of a fuse that has both', () => {
    expect(readRating('17.5 A continuous, 35 A blow')).toMatchObject({ amps: 17.5, blow: false });
    expect(readRating('35 A blow, continuous 17 A')).toMatchObject({ amps: 17, blow: false });
  });

  it('does not guess whether 1,000 Ω is one ohm or a thousand', () => {
    expect(readRating('12 V 1,000 Ω')).toMatchObject({ volts: 12, ohms: null });
  });

  it('has nothing of an empty cell, and reads no figures in a whole paragraph', () => {
    expect(readRating(' ')).toBeNull();
    expect(readRating(`30 W ${'and so on '.repeat(50)}`)).toMatchObject({ watts: null });
  });

  it('never throws, and gives finite figures', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9.,/ VAWΩhkmx-z]{0,30}$/)), (written) => {
        const rating = readRating(written);
        for (const figure of [rating?.volts, rating?.amps, rating?.watts, rating?.ohms, rating?.ampHours]) {
          if (typeof figure === 'number') expect(Number.isFinite(figure)).toBe(true);
        }
      }),
    );
  });
});
