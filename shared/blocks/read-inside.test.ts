import { describe, expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';

function inside(...rows: readonly string[]): string {
  return [':::inside{#flash-unit}', '| From | To | As | When |', '| - | - | - | - |', ...rows, ':::'].join('\n');
}

describe('the inside of a unit', () => {
  it('reads what is joined and when, in the order of the row', () => {
    const { block, findings } = blockOf(
      'inside',
      inside(
        '| 49 | 49a | joins | indicating |',
        '| KILL | | input to earth | |',
        '| out | – | output 10 A | KILL at open |',
      ),
    );
    expect(findings).toEqual([]);
    expect(block.id).toBe('flash-unit');
    expect(block.lines.map(({ address }) => address)).toEqual([
      'flash-unit@49--49a',
      'flash-unit@KILL',
      'flash-unit@out',
    ]);
    expect(block.lines[0]).toMatchObject({
      from: '49',
      to: '49a',
      as: { kind: 'joins' },
      when: { kind: 'words', words: 'indicating' },
    });
    expect(block.lines[2]).toMatchObject({
      to: null,
      as: { kind: 'output', amps: 10 },
      when: { kind: 'terminal', terminal: 'KILL', at: 'open' },
    });
  });

  it("takes the unit's own id before a terminal for what it is, and - for a terminal", () => {
    const { block } = blockOf('inside', inside('| flash-unit.49 | - | resistor 20 Ω | |'));
    expect(block.lines[0]).toMatchObject({ from: '49', to: '-', address: 'flash-unit@49---' });
  });

  it.each([
    ['| 49 | 49a | blinks | |', /blinks.*joins, diode, resistor 20 Ω/],
    ['| | 49a | joins | |', /no terminal/],
    ['| 49 | | joins | |', /two ends/],
  ])('keeps %s apart', (row, message) => {
    const { block, findings } = blockOf('inside', inside(row));
    expect(block.lines).toEqual([]);
    expect(block.unreadRows).toHaveLength(1);
    expect(findings).toMatchObject([{ code: 'block-unreadable', line: 4, address: '#flash-unit' }]);
    expect(findings[0]?.message).toMatch(message);
  });

  it('needs to know which unit', () => {
    expect(findingsOf(':::inside\n| From | As |\n| - | - |\n:::')[0]?.message).toMatch(/no id/);
    expect(findingsOf(':::inside{#x}\n| From | To |\n| - | - |\n:::')[0]?.message).toMatch(/`From` and `As`/);
  });
});
