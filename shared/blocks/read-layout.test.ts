import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cavitiesIn, mostCavities, readLayout } from './read-layout.ts';

/** A face drawn with a letter a seat, rows with + between them. */
function drawn(written: string): string | null {
  const layout = readLayout(written);
  if (layout === null) return null;
  if (layout.kind === 'ring') return `ring of ${layout.cavities}`;
  return layout.rows.map((row) => row.map((isCavity) => (isCavity ? 'x' : '.')).join('')).join('+');
}

describe('readLayout', () => {
  it.each([
    ['2x3', 'xxx+xxx'],
    ['2×3', 'xxx+xxx'],
    ['2 X 3', 'xxx+xxx'],
    ['5', 'xxxxx'],
    ['3+4', 'xxx+xxxx'],
    [' 3 + 4 ', 'xxx+xxxx'],
    ['xx.xx+xxxxx', 'xx.xx+xxxxx'],
    ['XX.+...+xxx', 'xx.+...+xxx'],
    ['2+x.x', 'xx+x.x'],
    ['round 6', 'ring of 6'],
    ['Round 6', 'ring of 6'],
    ['1', 'x'],
    ['x', 'x'],
  ])('reads %j as %s', (written, face) => {
    expect(drawn(written)).toBe(face);
  });

  it.each([
    '',
    '0',
    '2x0',
    '0x3',
    'round 0',
    'round',
    '...',
    '2x3x4',
    '3+',
    '+3',
    'square',
    '-2',
    '999x999',
    '201',
    '9'.repeat(50),
  ])('leaves %j unread', (written) => {
    expect(readLayout(written)).toBeNull();
  });

  it('counts rows × columns', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 14 }), fc.integer({ min: 1, max: 14 }), (rows, columns) => {
        const layout = readLayout(`${rows}x${columns}`);
        expect(layout === null ? null : cavitiesIn(layout)).toBe(rows * columns);
      }),
    );
  });

  it('never throws, and gives from one to the most cavities', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9x.+× ]{0,20}$/)), (written) => {
        const layout = readLayout(written);
        if (layout === null) return;
        expect(cavitiesIn(layout)).toBeGreaterThanOrEqual(1);
        expect(cavitiesIn(layout)).toBeLessThanOrEqual(mostCavities);
      }),
    );
  });
});
