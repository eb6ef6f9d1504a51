import { describe, expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';
import { readBetween } from './read-checks.ts';
import { formatTerminalName } from './terminal-name.ts';

function checks(...rows: readonly string[]): string {
  return [':::checks', '| Check | Between | Expect | At | How |', '| - | - | - | - | - |', ...rows, ':::'].join('\n');
}

describe('checks', () => {
  it('read what is measured where, and what to expect', () => {
    const { block, findings } = blockOf(
      'checks',
      checks(
        '| Pickup coil | igniter.1 – igniter.2 | 100–130 Ω | 20 °C | unplugged, engine cold |',
        '| Charging | battery.+ – battery.- | 13.8~14.6 V | 3000 rpm | |',
      ),
    );
    expect(findings).toEqual([]);
    expect(block.lines.map(({ address }) => address)).toEqual(['check@pickup-coil', 'check@charging']);
    expect(block.lines[0]).toMatchObject({
      check: 'Pickup coil',
      between: 'igniter.1 – igniter.2',
      terminals: [
        { id: 'igniter', terminal: '1' },
        { id: 'igniter', terminal: '2' },
      ],
      expect: { kind: 'range', lowest: 100, highest: 130, unit: 'Ω' },
      expectWritten: '100–130 Ω',
      at: '20 °C',
      how: 'unplugged, engine cold',
    });
    expect(block.lines[1]?.expect).toMatchObject({ lowest: 13.8, highest: 14.6 });
  });

  it.each(['about 5 Ω', '', '5 Ω'])('say of %j that it is no expectation', (written) => {
    const { block, findings } = blockOf('checks', checks(`| Coil | coil.+ – coil.- | ${written} | | |`));
    expect(block.lines[0]).toMatchObject({ expect: null, expectWritten: written });
    expect(findings).toMatchObject([{ code: 'expect-unreadable', severity: 'warn', line: 4, address: '#check@coil' }]);
  });

  it('keep apart a row that does not say what is checked', () => {
    expect(blockOf('checks', checks('| | a.1 – a.2 | open | | |')).block.unreadRows).toHaveLength(1);
    expect(findingsOf(':::checks\n| Check |\n| - |\n:::')[0]?.message).toMatch(/`Check` and `Expect`/);
  });
});

describe('readBetween', () => {
  it.each([
    ['igniter.1 – igniter.2', ['igniter.1', 'igniter.2']],
    ['battery.+ – battery.-', ['battery.+', 'battery.-']],
    ['battery.- - frame', ['battery.-', 'frame']],
    ['`coil.1` and frame', ['`coil.1`', 'frame']],
    ['headlight.3', ['headlight.3']],
  ])('finds the terminals of %j', (written, names) => {
    expect(readBetween(written).map(formatTerminalName)).toEqual(names.map((name) => name.replace(/`/g, '')));
  });

  it.each([
    '',
    'the plug lead and the cylinder head',
    'frame',
    'Battery terminals',
    'igniter.1 – the frame by the coil',
    'x'.repeat(300),
  ])('finds none in the place %j', (written) => {
    expect(readBetween(written)).toEqual([]);
  });
});
