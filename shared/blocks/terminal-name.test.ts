import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatTerminalName, readTerminalName, readTerminalNames } from './terminal-name.ts';

describe('readTerminalName', () => {
  it.each([
    ['headlight.3', 'headlight', '3'],
    ['battery.+', 'battery', '+'],
    ['battery.-', 'battery', '-'],
    ['unit.B+', 'unit', 'B+'],
    ['unit.5.1', 'unit', '5.1'],
    ['unit.?', 'unit', '?'],
    ['`dip-switch.Y`', 'dip-switch', 'Y'],
  ])('divides %s at its first dot', (written, id, terminal) => {
    expect(readTerminalName(written)).toEqual({ id, terminal });
  });

  it('takes a text without a terminal for an id alone', () => {
    expect(readTerminalName('frame')).toEqual({ id: 'frame', terminal: null });
    expect(readTerminalName('frame.')).toEqual({ id: 'frame.', terminal: null });
    expect(readTerminalName(' ')).toBeNull();
  });

  it('reads what formatTerminalName writes', () => {
    const id = fc.stringMatching(/^[a-z0-9]{1,6}(-[a-z0-9]{1,4})?$/);
    const terminal = fc.option(fc.stringMatching(/^[A-Za-z0-9+.?-]{1,5}$/));
    fc.assert(
      fc.property(id, terminal, (name, end) => {
        const written = { id: name, terminal: end };
        expect(readTerminalName(formatTerminalName(written))).toEqual(written);
      }),
    );
  });
});

describe('readTerminalNames', () => {
  it('reads several destinations, and none in a dash', () => {
    expect(readTerminalNames('dip-switch.YR, main-lamp.+; frame').map(formatTerminalName)).toEqual([
      'dip-switch.YR',
      'main-lamp.+',
      'frame',
    ]);
    expect(readTerminalNames('–')).toEqual([]);
    expect(readTerminalNames('')).toEqual([]);
  });

  it('keeps words that name no terminal, for a finding about a name that nobody has', () => {
    expect(readTerminalNames('somewhere under the tank')).toEqual([{ id: 'somewhere under the tank', terminal: null }]);
  });
});
