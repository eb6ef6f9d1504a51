import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Difference } from './difference.ts';
import { differenceOf } from './difference.ts';
import { readTextLines } from './text-line.ts';

/** The text that one side of a difference carries. */
function sideOf(difference: Difference, side: 'from' | 'to'): string {
  const own = side === 'from' ? 'removed' : 'added';
  return difference.lines
    .filter((line) => (side === 'from' ? line.fromLine : line.toLine) !== null)
    .map((line) =>
      line.words
        .filter(({ kind }) => kind === 'same' || kind === own)
        .map(({ text }) => text)
        .join(''),
    )
    .join('\n');
}

/** A text as a comparison shows it: table rows without padding. */
function shown(text: string): string {
  return readTextLines(text)
    .map((line) => line.text)
    .join('\n');
}

/** What changed, in a form that reads: `-` removed, `+` added, `~` changed with [removed] and {added}. */
function brief(difference: Difference): string[] {
  const signs = { same: ' ', removed: '-', added: '+', changed: '~' } as const;
  const marks = { same: ['', ''], removed: ['[', ']'], added: ['{', '}'] } as const;
  return difference.lines
    .filter(({ kind }) => kind !== 'same')
    .map(({ kind, words }) => {
      const text = words.map((word) =>
        kind === 'changed' ? `${marks[word.kind][0]}${word.text}${marks[word.kind][1]}` : word.text,
      );
      return `${signs[kind]} ${text.join('')}`;
    });
}

describe('the difference of two texts', () => {
  it('shows every line of a text that replaces nothing as added', () => {
    expect(brief(differenceOf('', 'One.\n\nTwo.'))).toEqual(['+ One.', '+ ', '+ Two.']);
  });

  it('shows nothing where nothing changed', () => {
    expect(brief(differenceOf('One.\n\nTwo.', 'One.\n\nTwo.'))).toEqual([]);
  });

  it('shows the words that changed inside a line', () => {
    const from = 'Take the lead off.\nThe fuse is 15 A.';
    const to = 'Take the lead off.\nThe fuse is 20 A, blade type.';
    expect(brief(differenceOf(from, to))).toEqual(['~ The fuse is [15]{20} A{, blade type}.']);
  });

  it('keeps a wire code whole', () => {
    expect(brief(differenceOf('| 2 | Y/R | Main beam |', '| 2 | Y/B | Main beam |'))).toEqual([
      '~ 2 | [Y/R]{Y/B} | Main beam',
    ]);
  });

  it('takes padding of cells and the length of the rule for no change', () => {
    const from = '| Cavity | Wire |\n| --- | --- |\n| 1 | Y |';
    const to = '| Cavity | Wire |\n| ------ | ---- |\n| 1      | Y    |';
    expect(brief(differenceOf(from, to))).toEqual([]);
  });

  it('matches rows by their first cell when rows change and one comes between', () => {
    const from = '| 1 | Y | Dip |\n| 2 | Y/R | Main |\n| 4 | B | Earth |';
    const to = '| 1 | Y | Dip beam |\n| 2 | R/Y | Main beam |\n| 3 | – | blank |\n| 4 | B/W | Earth |';
    expect(brief(differenceOf(from, to))).toEqual([
      '~ 1 | Y | Dip{ beam}',
      '~ 2 | [Y/R]{R/Y} | Main{ beam}',
      '+ 3 | – | blank',
      '~ 4 | [B]{B/W} | Earth',
    ]);
  });

  it('shows a column that was added in every row of its table', () => {
    const from = '| Cavity | Wire |\n| --- | --- |\n| 1 | Y |';
    const to = '| Cavity | Wire | mm² |\n| --- | --- | --- |\n| 1 | Y | 0.85 |';
    expect(brief(differenceOf(from, to))).toEqual([
      '~ Cavity | Wire{ | mm²}',
      '~ --- | ---{ | ---}',
      '~ 1 | Y{ | 0.85}',
    ]);
  });

  it('never takes a row of a table for a line of text', () => {
    expect(brief(differenceOf('1 | Y', '| 1 | Y |'))).toEqual(['- 1 | Y', '+ 1 | Y']);
  });

  it('counts lines in each text from one', () => {
    const { lines } = differenceOf('a\nb\nc', 'a\nx y z\nb\nc');
    expect(lines.map(({ fromLine, toLine }) => [fromLine, toLine])).toEqual([
      [1, 1],
      [null, 2],
      [2, 3],
      [3, 4],
    ]);
  });

  it('says that it is coarse where the texts are too far apart, and still carries both whole', () => {
    const from = Array.from({ length: 900 }, (_, index) => `old ${String(index)}`).join('\n');
    const to = Array.from({ length: 900 }, (_, index) => `new ${String(index * 7)}`).join('\n');
    const difference = differenceOf(`same\n${from}\nend`, `same\n${to}\nend`);
    expect(difference.coarse).toBe(true);
    expect(sideOf(difference, 'from')).toBe(`same\n${from}\nend`);
    expect(sideOf(difference, 'to')).toBe(`same\n${to}\nend`);
  });

  const lineArbitrary = fc.oneof(
    fc.constantFrom('', '---', '| 1 | Y |', '| 2 | Y/R |', '|', '| \\| | a', ':::', '- a', '  | x |  y |'),
    fc
      .array(fc.constantFrom('fuse', 'wire', '15', 'A,', 'Y/R', '.', ' ', '|'), { maxLength: 8 })
      .map((words) => words.join(' ')),
    fc.string({ maxLength: 12 }).map((text) => text.replaceAll('\n', ' ')),
  );
  const textArbitrary = fc.array(lineArbitrary, { maxLength: 25 }).map((lines) => lines.join('\n'));

  it('gives both texts back, whatever they are', () => {
    fc.assert(
      fc.property(textArbitrary, textArbitrary, (from, to) => {
        const difference = differenceOf(from, to);
        expect(sideOf(difference, 'from')).toBe(shown(from));
        expect(sideOf(difference, 'to')).toBe(shown(to));
      }),
      { numRuns: 500 },
    );
  });

  it('keeps the lines of both texts in their order', () => {
    fc.assert(
      fc.property(textArbitrary, textArbitrary, (from, to) => {
        const { lines } = differenceOf(from, to);
        const numbers = (side: 'fromLine' | 'toLine'): number[] =>
          lines.map((line) => line[side]).filter((number) => number !== null);
        const counted = (text: string): number[] => readTextLines(text).map((_, index) => index + 1);
        expect(numbers('fromLine')).toEqual(counted(from));
        expect(numbers('toLine')).toEqual(counted(to));
      }),
      { numRuns: 300 },
    );
  });

  it('says of a text and itself that every line is the same', () => {
    fc.assert(
      fc.property(textArbitrary, (text) => {
        expect(differenceOf(text, text).lines.every(({ kind }) => kind === 'same')).toBe(true);
      }),
    );
  });
});
