import { describe, expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';

function components(...rows: readonly string[]): string {
  return [
    ':::components{cite="m1"}',
    '| Id | Kind | Name | Rating | Earthed by | Years | Cite |',
    '| - | - | - | - | - | - | - |',
    ...rows,
    ':::',
  ].join('\n');
}

describe('components', () => {
  it('read a row each', () => {
    const { block, findings } = blockOf(
      'components',
      components(
        '| main-fuse | fuse | Main fuse | 35 A blow | | | |',
        '| start-relay | relay | Starter relay | 12 V 4 Ω | 85: frame | 1980- | c1 |',
        '| frame | Earth | | | | | |',
      ),
    );
    expect(findings).toEqual([]);
    expect(block.lines.map(({ address }) => address)).toEqual(['main-fuse', 'start-relay~1980-', 'frame']);
    expect(block.lines[0]).toMatchObject({
      id: 'main-fuse',
      componentKind: 'fuse',
      name: 'Main fuse',
      rating: { amps: 35, blow: true },
      earthedBy: null,
      cite: 'm1',
    });
    expect(block.lines[1]).toMatchObject({ earthedBy: { terminal: '85', earth: 'frame' }, cite: 'c1' });
    expect(block.lines[2]).toMatchObject({ componentKind: 'earth', name: null, rating: null });
  });

  it('read an earth without a terminal, and a kind with a space', () => {
    const { block } = blockOf('components', components('| coil | Ignition coil | | | frame |'));
    expect(block.lines[0]).toMatchObject({
      componentKind: 'ignition-coil',
      earthedBy: { terminal: null, earth: 'frame' },
    });
  });

  it('keep apart what has no id or no kind, and read the rest', () => {
    const { block, findings } = blockOf(
      'components',
      components('| Main Fuse | fuse |', '| horn | hooter |', '| frame | earth |'),
    );
    expect(block.lines.map(({ id }) => id)).toEqual(['frame']);
    expect(block.unreadRows).toHaveLength(2);
    expect(findings.map(({ code, line }) => [code, line])).toEqual([
      ['block-unreadable', 4],
      ['block-unreadable', 5],
    ]);
    expect(findings[1]?.message).toMatch(/hooter.*battery, earth, splice/);
  });

  it('say of an earth that it cannot be read', () => {
    expect(blockOf('components', components('| horn | load | | | the frame, somewhere |')).findings).toMatchObject([
      { code: 'block-unreadable', line: 4, address: '#horn' },
    ]);
  });

  it('need ids and kinds', () => {
    expect(findingsOf(':::components\n| Id | Name |\n| - | - |\n:::')[0]?.message).toMatch(/`Id` and `Kind`/);
    expect(findingsOf(':::components\n:::')[0]?.message).toMatch(/no table/);
  });
});
