import { describe, expect, it } from 'vitest';
import { readCondition, readInsideJoin } from './read-inside-join.ts';

describe('readInsideJoin', () => {
  it.each([
    ['joins', { kind: 'joins' }],
    ['Diode', { kind: 'diode' }],
    ['resistor 20 Ω', { kind: 'resistor', ohms: 20 }],
    ['resistor 4,7 kΩ', { kind: 'resistor', ohms: 4700 }],
    ['resistor 20 ohms', { kind: 'resistor', ohms: 20 }],
    ['output 10 A', { kind: 'output', amps: 10 }],
    ['output 500 mA', { kind: 'output', amps: 0.5 }],
    ['input to earth', { kind: 'input to earth' }],
    ['Input  to live', { kind: 'input to live' }],
  ])('reads %j', (written, join) => {
    expect(readInsideJoin(written)).toEqual(join);
  });

  it.each(['', 'resistor', 'resistor Ω', 'resistor -5 Ω', 'output', 'output 10', 'input', 'input to ground', 'magic'])(
    'leaves %j unread',
    (written) => {
      expect(readInsideJoin(written)).toBeNull();
    },
  );
});

describe('readCondition', () => {
  it('reads the state of a terminal', () => {
    expect(readCondition('KILL at earth')).toEqual({ kind: 'terminal', terminal: 'KILL', at: 'earth' });
    expect(readCondition('86 at Live')).toEqual({ kind: 'terminal', terminal: '86', at: 'live' });
    expect(readCondition('N at open')).toEqual({ kind: 'terminal', terminal: 'N', at: 'open' });
  });

  it('keeps any other words, which mean that it may be either way', () => {
    expect(readCondition('indicating')).toEqual({ kind: 'words', words: 'indicating' });
    expect(readCondition('the stand is up')).toEqual({ kind: 'words', words: 'the stand is up' });
  });

  it('is no condition where nothing is written', () => {
    expect(readCondition(' ')).toBeNull();
  });
});
