import fc from 'fast-check';
import remarkGfm from 'remark-gfm';
import remarkParse from 'remark-parse';
import { unified } from 'unified';
import { describe, expect, it } from 'vitest';
import { formatTable, parseTable } from './table-source.ts';

describe('parseTable', () => {
  it('reads headings, rows and the lines that they stand on', () => {
    expect(parseTable('| Cavity | Wire |\n| --- | --- |\n| 1 | Y |\n| 2 | Y/R |', 12)).toEqual({
      headings: ['Cavity', 'Wire'],
      rows: [
        { cells: ['1', 'Y'], line: 14 },
        { cells: ['2', 'Y/R'], line: 15 },
      ],
      line: 12,
    });
  });

  it('finds a table below other text, and ends it at an empty line or another block', () => {
    const text = 'Some words.\n\n| A |\n| - |\n| 1 |\n\n| 2 |';
    expect(parseTable(text, 1)).toEqual({ headings: ['A'], rows: [{ cells: ['1'], line: 5 }], line: 3 });
    for (const end of [':::', '> quote', '# Heading', '- item', '```', '***']) {
      expect(parseTable(`| A |\n| - |\n| 1 |\n${end}`, 1)?.rows, end).toHaveLength(1);
    }
  });

  it('fills short rows and keeps what stands beyond the last column', () => {
    const rows = parseTable('| A | B |\n| - | - |\n| 1 |\n| 1 | 2 | 3 |', 1)?.rows;
    expect(rows?.map(({ cells }) => cells)).toEqual([
      ['1', ''],
      ['1', '2', '3'],
    ]);
  });

  it('needs no pipes at the ends, and takes a row without any for its first cell', () => {
    expect(parseTable('A | B\n- | -\n1 | 2\nalone', 1)?.rows.map(({ cells }) => cells)).toEqual([
      ['1', '2'],
      ['alone', ''],
    ]);
  });

  it('leaves cells as their source, so nothing in them is emphasis', () => {
    const table = parseTable('| Expect | Part |\n| - | - |\n| 13.8~14.6 V at 3~4 | A*B*C |', 1);
    expect(table?.rows[0]?.cells).toEqual(['13.8~14.6 V at 3~4', 'A*B*C']);
  });

  it('undoes escaped pipes, inside code spans too, where a bare one divides as well', () => {
    expect(parseTable('| A | B |\n| - | - |\n| a\\|b | `c\\|d` |', 1)?.rows[0]?.cells).toEqual(['a|b', '`c|d`']);
    expect(parseTable('| A | B |\n| - | - |\n| `c|d` |', 1)?.rows[0]?.cells).toEqual(['`c', 'd`']);
    expect(parseTable('| A | B |\n| - | - |\n| a\\\\| b |', 1)?.rows[0]?.cells).toEqual(['a\\\\', 'b']);
  });

  it('keeps how the columns stand', () => {
    expect(parseTable('| A | B | C | D |\n| :- | -: | :-: | - |', 1)?.alignments).toEqual([
      'left',
      'right',
      'center',
      null,
    ]);
  });

  it.each(['', 'words', '| A | B |', '| A | B |\n| - |', '| A |\n| x |', 'A\n-', '| A |\n\n| - |'])(
    'finds no table in %j',
    (text) => {
      expect(parseTable(text, 1)).toBeNull();
    },
  );

  it('reads no row where there is none: a heading by itself is an empty table', () => {
    expect(parseTable('| A |\n| - |', 1)?.rows).toEqual([]);
  });

  it('divides rows as the GFM parser does', () => {
    const parser = unified().use(remarkParse).use(remarkGfm).freeze();
    const cell = fc.stringMatching(/^[a-c0-9/|\\ `+●²-]{0,8}$/);
    fc.assert(
      fc.property(fc.array(fc.tuple(cell, cell), { maxLength: 4 }), (pairs) => {
        const text = ['| A | B |', '| - | - |', ...pairs.map(([a, b]) => `| ${a} | ${b} |`)].join('\n');
        const [node] = parser.parse(text).children;
        const counts = node?.type === 'table' ? node.children.slice(1).map((row) => row.children.length) : null;
        const table = parseTable(text, 1);
        expect(table?.rows.map(({ cells }) => cells.length)).toEqual(counts?.map((count) => Math.max(count, 2)));
      }),
      { numRuns: 300 },
    );
  });
});

describe('formatTable', () => {
  it('aligns columns by what one sees of their text', () => {
    const table = parseTable('|Position|R|BR|\n|-|-|-|\n|Off|||\n|On|●|●|', 1);
    expect(table === null ? '' : formatTable(table)).toBe(
      [
        '| Position | R   | BR  |',
        '| -------- | --- | --- |',
        '| Off      |     |     |',
        '| On       | ●   | ●   |',
      ].join('\n'),
    );
  });

  it('puts figures to the right where the column says so', () => {
    const table = parseTable('| mm² |\n| -: |\n| 0.85 |\n| 3 |', 1);
    expect(table === null ? '' : formatTable(table)).toBe(['|  mm² |', '| ---: |', '| 0.85 |', '|    3 |'].join('\n'));
  });

  it('loses nothing: what it writes reads as the same table, and is written the same again', () => {
    const cell = fc.stringMatching(/^[A-Za-z0-9/|\\ `~*●²Ω車-]{0,10}$/);
    const line = fc.array(cell, { minLength: 1, maxLength: 5 }).map((cells) => `| ${cells.join(' | ')} |`);
    const delimiter = fc.array(fc.constantFrom('-', ':-', '-:', ':-:'), { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(line, delimiter, fc.array(line, { maxLength: 4 }), (heading, dashes, rows) => {
        const table = parseTable([heading, `| ${dashes.join(' | ')} |`, ...rows].join('\n'), 1);
        fc.pre(table !== null);
        const written = formatTable(table);
        const again = parseTable(written, table.line);
        expect(again).toEqual(table);
        expect(again === null ? '' : formatTable(again)).toBe(written);
      }),
    );
  });
});
