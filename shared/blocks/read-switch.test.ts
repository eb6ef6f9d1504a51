import { describe, expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';

function aSwitch(attributes: string, heading: string, ...rows: readonly string[]): string {
  const columns = heading.split('|').length - 2;
  return [`:::switch{#ignition ${attributes}}`, heading, `|${' - |'.repeat(columns)}`, ...rows, ':::'].join('\n');
}

const ignition = ['| Off | | | |', '| On | ● | ● | |', '| Park | ● | | ● |'];

describe('a switch', () => {
  it('reads its positions and what they join', () => {
    const { block, findings } = blockOf(
      'switch',
      aSwitch(
        'name="Ignition switch" zone="bars" role="ignition" rest="off"',
        '| Position | R | BR | L |',
        ...ignition,
      ),
    );
    expect(findings).toEqual([]);
    expect(block).toMatchObject({
      role: 'ignition',
      rest: 'Off',
      sprung: [],
      movesWith: null,
      contacts: ['R', 'BR', 'L'],
      zone: 'bars',
    });
    expect(block.lines.map(({ address, joined }) => [address, joined])).toEqual([
      ['ignition@off', []],
      ['ignition@on', [['R', 'BR']]],
      ['ignition@park', [['R', 'L']]],
    ]);
  });

  it('takes every column that is nothing else for a contact', () => {
    const { block } = blockOf(
      'switch',
      aSwitch('', '| Position | R/Y | Note | 31 | Years |', '| On | x | stiff | x | 1980- |'),
    );
    expect(block.contacts).toEqual(['R/Y', '31']);
    expect(block.lines[0]).toMatchObject({ address: 'ignition@on~1980-', note: 'stiff', joined: [['R/Y', '31']] });
    expect(block.columns.map(({ role }) => role)).toEqual(['position', 'contact', 'note', 'contact', 'years']);
  });

  it('takes ●, x and o for one mark, in any case, and other letters for further groups', () => {
    const joined = (row: string): unknown =>
      blockOf('switch', aSwitch('', '| Position | 1 | 2 | 3 | 4 | 5 |', row)).block.lines[0]?.joined;
    expect(joined('| On | ● | x | o | X | O |')).toEqual([['1', '2', '3', '4', '5']]);
    expect(joined('| On | x | a | o | A | – |')).toEqual([
      ['1', '3'],
      ['2', '4'],
    ]);
    expect(joined('| On | a | b | | | |')).toEqual([]);
  });

  it('says of a cell that it is no mark, and joins nothing by it', () => {
    const { block, findings } = blockOf('switch', aSwitch('', '| Position | 1 | 2 |', '| On | yes | yes |'));
    expect(block.lines[0]?.joined).toEqual([]);
    expect(findings).toMatchObject([{ code: 'block-unreadable', line: 4, address: '#ignition@on' }]);
  });

  it('knows positions that one holds for a moment, and what moves with it', () => {
    const { block, findings } = blockOf(
      'switch',
      aSwitch('sprung="on, Park" moves-with="lights"', '| Position | R | BR | L |', ...ignition),
    );
    expect(findings).toEqual([]);
    expect(block).toMatchObject({ sprung: ['On', 'Park'], movesWith: 'lights', role: 'other', rest: null });
  });

  it.each([
    ['rest="Lock"', /Lock.*none of its positions \(Off, On, Park\)/],
    ['sprung="Start"', /Start.*none of its positions/],
    ['role="ignitoin"', /ignition, kill, start/],
  ])('says of %s that it is not known', (wrong, message) => {
    const { findings } = blockOf('switch', aSwitch(wrong, '| Position | R | BR | L |', ...ignition));
    expect(findings).toMatchObject([{ code: 'block-unreadable', line: 1, address: '#ignition' }]);
    expect(findings[0]?.message).toMatch(message);
  });

  it('says that two contacts have one name, and takes them for one', () => {
    const { block, findings } = blockOf('switch', aSwitch('', '| Position | R | R | L |', '| On | x | x | x |'));
    expect(findings[0]?.message).toMatch(/two contacts/);
    expect(block.lines[0]?.joined).toEqual([['R', 'L']]);
  });

  it('cannot be read without an id, a table or positions', () => {
    expect(findingsOf(':::switch\n| Position |\n| - |\n:::')[0]?.message).toMatch(/no id/);
    expect(findingsOf(':::switch{#x}\n:::')[0]?.message).toMatch(/no table/);
    expect(findingsOf(':::switch{#x}\n| R | B |\n| - | - |\n:::')[0]?.message).toMatch(/`Position`/);
  });
});
