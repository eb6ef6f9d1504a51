import { describe, expect, it } from 'vitest';
import { cellsOf, isTableRule, stretchesOf, type LineChange } from './difference-stretches.ts';

function line(
  number: number,
  kind: LineChange['kind'] = 'same',
  table = false,
  text = `line ${String(number)}`,
): LineChange {
  const wordKind = kind === 'changed' ? 'same' : kind;
  return { kind, table, fromLine: number, toLine: number, words: [{ kind: wordKind, text }] };
}

describe('the stretches of a comparison', () => {
  it('fold away what is far from any change and keep its neighbours in sight', () => {
    const lines = Array.from({ length: 15 }, (_, index) => line(index + 1, index === 7 ? 'changed' : 'same'));
    expect(stretchesOf(lines, 2).map(({ kind, lines: held }) => [kind, held.map(({ toLine }) => toLine)])).toEqual([
      ['folded', [1, 2, 3, 4, 5]],
      ['text', [6, 7, 8, 9, 10]],
      ['folded', [11, 12, 13, 14, 15]],
    ]);
  });

  it('leave a short run open, which its fold would not make shorter', () => {
    const lines = Array.from({ length: 9 }, (_, index) =>
      line(index + 1, index === 0 || index === 8 ? 'added' : 'same'),
    );
    expect(stretchesOf(lines, 2).map(({ kind }) => kind)).toEqual(['text']);
  });

  it('keep the rows of a table together and apart from the text', () => {
    const lines = [line(1, 'added'), line(2, 'same', true), line(3, 'changed', true), line(4)];
    expect(stretchesOf(lines, 2).map(({ kind, lines: held }) => [kind, held.length])).toEqual([
      ['text', 1],
      ['table', 2],
      ['text', 1],
    ]);
  });

  it('fold everything where nothing changed', () => {
    expect(stretchesOf([line(1), line(2), line(3)], 2).map(({ kind }) => kind)).toEqual(['folded']);
  });

  it('lose no line', () => {
    const lines = Array.from({ length: 40 }, (_, index) =>
      line(index, index % 13 === 0 ? 'removed' : 'same', index % 5 === 0),
    );
    expect(stretchesOf(lines, 2).flatMap(({ lines: held }) => held)).toEqual(lines);
  });
});

describe('the cells of a changed row', () => {
  it('keep each word’s change inside its own cell', () => {
    const words = [
      { kind: 'same', text: '2 | Y/' },
      { kind: 'removed', text: 'R' },
      { kind: 'added', text: 'B' },
      { kind: 'same', text: ' | Main beam' },
    ] as const;
    expect(cellsOf(words)).toEqual([
      [{ kind: 'same', text: '2' }],
      [
        { kind: 'same', text: 'Y/' },
        { kind: 'removed', text: 'R' },
        { kind: 'added', text: 'B' },
      ],
      [{ kind: 'same', text: 'Main beam' }],
    ]);
  });

  it('do not count the bars that a row begins and ends with, and keep empty cells between', () => {
    expect(cellsOf([{ kind: 'added', text: '| 3 |  | blank |' }])).toEqual([
      [{ kind: 'added', text: '3' }],
      [],
      [{ kind: 'added', text: 'blank' }],
    ]);
  });
});

it('knows the rule under a table’s heading, also one that grew, from a row of dashes that came', () => {
  expect(isTableRule(line(1, 'same', true, '| --- | :--: |'))).toBe(true);
  expect(isTableRule(line(1, 'changed', true, '| --- | :--: | --- |'))).toBe(true);
  expect(isTableRule(line(1, 'added', true, '| --- | :--: |'))).toBe(false);
  expect(isTableRule(line(1, 'same', true, '| 3 | – |'))).toBe(false);
});
