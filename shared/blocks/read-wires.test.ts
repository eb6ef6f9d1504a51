import { describe, expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';
import { readLengthMetres } from './read-wires.ts';

function wires(...rows: readonly string[]): string {
  return [
    ':::wires',
    '| From | To | Wire | mm² | Length m | Signal |',
    '| - | - | - | - | - | - |',
    ...rows,
    ':::',
  ].join('\n');
}

describe('wires', () => {
  it('read both ends, and have one address whichever comes first', () => {
    const { block, findings } = blockOf(
      'wires',
      wires(
        '| battery.+ | main-fuse.in | R | 3.0 | 0.25 | Feed |',
        '| main-fuse.out | ignition.R | R | | | |',
        '| frame | battery.- | B | | 250 mm | |',
      ),
    );
    expect(findings).toEqual([]);
    expect(block.lines.map(({ address }) => address)).toEqual([
      'battery.+--main-fuse.in',
      'ignition.R--main-fuse.out',
      'battery.---frame',
    ]);
    expect(block.lines[0]).toMatchObject({
      from: { id: 'battery', terminal: '+' },
      to: { id: 'main-fuse', terminal: 'in' },
      removed: false,
      size: { squareMillimetres: 3 },
      lengthMetres: 0.25,
      circuit: 'Feed',
    });
    expect(block.lines[2]).toMatchObject({ to: { id: 'battery', terminal: '-' }, lengthMetres: 0.25 });
  });

  it('know a wire that a modification takes away', () => {
    const { block, findings } = blockOf(
      'wires',
      wires('| ignition.R | main-fuse.out | removed | | | |', '| ignition.R | unit.bat | R | | | |'),
    );
    expect(findings).toEqual([]);
    expect(block.lines[0]).toMatchObject({ removed: true, wire: null });
    expect(block.lines[1]).toMatchObject({ removed: false, address: 'ignition.R--unit.bat' });
  });

  it('keep a row with one end apart, and say what a length should be', () => {
    const { block, findings } = blockOf('wires', wires('| battery.+ | | R |', '| a.1 | b.1 | R | | two feet | |'));
    expect(block.unreadRows).toHaveLength(1);
    expect(findings.map(({ line }) => line)).toEqual([4, 5]);
    expect(findings[1]).toMatchObject({ code: 'block-unreadable', address: '#a.1--b.1' });
  });

  it('need both columns', () => {
    expect(findingsOf(':::wires\n| From | Wire |\n| - | - |\n:::')[0]?.message).toMatch(/`From` and `To`/);
  });
});

describe('readLengthMetres', () => {
  it.each([
    ['0.25', 0.25],
    ['0,25 m', 0.25],
    ['25 cm', 0.25],
    ['250 mm', 0.25],
    ['0', 0],
  ])('reads %j', (written, metres) => {
    expect(readLengthMetres(written)).toBe(metres);
  });

  it.each(['', '-1', '500', '1 km', 'long', '1,000'])('leaves %j unread', (written) => {
    expect(readLengthMetres(written)).toBeNull();
  });
});
