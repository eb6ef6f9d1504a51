import { describe, expect, test } from 'vitest';
import { findableWords, plainText, plainWords, singular } from './words.ts';

describe('plain words', () => {
  test('have no accents, no capitals and no ligatures', () => {
    expect(plainText('Sørvik Straße, 0.85 mm²')).toBe('sorvik strasse, 0.85 mm2');
  });

  test('lose the s of a plural and keep the s of a word', () => {
    expect(['fuses', 'switches', 'batteries', 'boxes', 'brass', 'bus', 'chassis', 'gas'].map(singular)).toEqual([
      'fuse',
      'switch',
      'battery',
      'box',
      'brass',
      'bus',
      'chassi',
      'gas',
    ]);
  });

  test('come apart at hyphens, slashes and dots', () => {
    expect(plainWords('tell-tale of Y/R at dip-switch.HI')).toEqual([
      'tell',
      'tale',
      'of',
      'y',
      'r',
      'at',
      'dip',
      'switch',
      'hi',
    ]);
  });
});

describe('what a text can be found by', () => {
  test('is one concept under all its names', () => {
    expect(findableWords('Left turn signal').strong).toContain('~indicator');
    expect(findableWords('Left blinker').strong).toContain('~indicator');
    expect(findableWords('High beam').strong).toEqual(findableWords('Full beam').strong);
  });

  test('is the longer concept first, and the shorter one inside it only weakly', () => {
    const { strong, weak, units } = findableWords('Dip switch');
    expect(strong).toEqual(['~dipswitch']);
    expect(weak).toEqual(expect.arrayContaining(['dip', 'switch', '~dip', '~switch']));
    expect(units).toBe(1);
  });

  test('is a model with its number joined and apart, and a rating with its unit', () => {
    expect(findableWords('QF550').weak).toEqual(expect.arrayContaining(['qf', '550']));
    expect(findableWords('QF-550').weak).toContain('qf550');
    expect(findableWords('fuse, 15 A').weak).toContain('15a');
  });

  test('is a decimal as a whole, and never its halves', () => {
    const { strong, weak } = findableWords('1.3 m');
    expect([...strong, ...weak]).toContain('1.3');
    expect([...strong, ...weak]).not.toContain('3');
  });
});
