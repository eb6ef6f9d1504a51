import fc from 'fast-check';
import { JSDOM } from 'jsdom';
import { describe, expect, it } from 'vitest';
import { formatPage } from '../../shared/dialect/format-page.ts';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';

const { document } = new JSDOM('').window;

function htmlOf(markdown: string): string | null {
  const page = readPage(markdown);
  return page.ok ? renderPage(page.value, { address: null, variant: anyVariant, marks: 'shown' }) : null;
}

/** Bits of Markdown, of the dialect and of nothing at all, as somebody might leave them lying about. */
const bits = fc.constantFrom(
  '---\n', 'title: a\n', '\n', '\n\n', '\r\n', ' ', '    ', '\t', '> ', '- ', '1. ', '# ', '```\n', '~~~', ':::', '::::', ':::connector{#a}\n',
  ':::connector{#a name="', ':::hazard{signal="warning" of="battery"}\n', '::calculator{name="x"}\n', ':::checks\n', ':::note\n', '::', ':a',
  '| a | b |\n', '| - | - |\n', '| Cavity | Wire |\n', '| 1 | Y/R |\n', '| 1 | BR | 3\n', '|', '\\|', '\\', '*', '**', '_', '`', '[', ']', '](', ')',
  '![', '[^1]', '[^1]: ', '[a]: b\n', '<b>', '</div>', '<!--', '-->', '&amp;', 'http://a.b', 'a@b.c', '~', '~~', '12:30', 'word', 'Ω', '😀', '\u0000',
  '\uD800', '\u202E', '___', '===\n', '{', '}', '"', "'", '#', '+', '.', '●',
);
const scraps = fc.array(fc.oneof({ weight: 6, arbitrary: bits }, { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 12 }) }), { maxLength: 60 }).map((parts) => parts.join(''));

const cell = fc
  .array(fc.constantFrom('Y/R', 'main', 'beam', 'A*B', '13.8~14.6', '*x*', '`code`', '[a](b)', '<b>', 'C3:14', '|', 'Ω', '_u_', '~~s~~', '"q"', '&amp;', ':::'), { maxLength: 3 })
  .map((words) => words.join(' '));

/** A page with a connector and a table of checks, in which every cell may be anything. */
const pageOfCells = fc.array(fc.tuple(cell, cell, cell, cell), { minLength: 1, maxLength: 5 }).map((rows) => {
  const written = rows.map((cells) => cells.map((text) => text.replace(/\|/g, '\\|')));
  const connector = written.map(([wire, circuit, goesTo, note], at) => `| ${at + 1} | ${wire} | ${circuit} | ${goesTo} | ${note} |`);
  const checks = written.map(([between, expectation, how, note], at) => `|check ${at}|${between}|${expectation}|${how}|${note}|`);
  const markdown = [
    'Before the block.', '', ':::connector{#plug name="A plug" layout="5" zone=bars}', '| Cavity | Wire | Circuit | Goes to | Note |', '|---|:--|---|--:|:-:|', ...connector,
    ':::', '', 'Between.', '', ':::checks{cite="m1"}', '| Check | Between | Expect | How | Other |', '| - | - | - | - | - |', ...checks, ':::', '',
  ].join('\n');
  return { rows, markdown };
});

describe('Any text at all', () => {
  it('is read and shown, or refused, and never throws', () => {
    fc.assert(
      fc.property(scraps, (markdown) => {
        expect(() => htmlOf(markdown)).not.toThrow();
      }),
      { numRuns: 300 },
    );
  });

  it('survives being written by the book: what is written twice is the same, and has the same blocks', () => {
    fc.assert(
      fc.property(scraps, (markdown) => {
        const written = formatPage(markdown);
        expect(formatPage(written)).toBe(written);
        const [before, after] = [readPage(markdown), readPage(written)];
        if (before.ok && after.ok) expect(after.value.blocks).toEqual(before.value.blocks);
      }),
      { numRuns: 200 },
    );
  });

  it('is plain data once read, and looks the same when that comes back from JSON', () => {
    fc.assert(
      fc.property(scraps, (markdown) => {
        const page = readPage(markdown);
        if (!page.ok) return;
        const copy: typeof page.value = JSON.parse(JSON.stringify(page.value));
        const options = { address: null, variant: anyVariant, marks: 'shown' } as const;
        expect(renderPage(copy, options)).toBe(renderPage(page.value, options));
      }),
      { numRuns: 60 },
    );
  });
});

describe('Cells of blocks', () => {
  it('are shown with every word that was written in them', () => {
    fc.assert(
      fc.property(pageOfCells, ({ rows, markdown }) => {
        const body = document.createElement('body');
        body.innerHTML = htmlOf(markdown) ?? '';
        const shown = body.textContent;
        for (const text of rows.flat()) expect(shown).toContain(text);
      }),
      { numRuns: 100 },
    );
  });

  it('are the same after the book has written their table, and so is everything around it', () => {
    fc.assert(
      fc.property(pageOfCells, ({ markdown }) => {
        const written = formatPage(markdown);
        expect(formatPage(written)).toBe(written);
        const [before, after] = [readPage(markdown), readPage(written)];
        if (!before.ok || !after.ok) throw new Error('refused');
        expect(after.value.blocks).toEqual(before.value.blocks);
        expect(written).toContain('Before the block.\n\n:::connector{#plug ');
        expect(written).toContain('\n:::\n\nBetween.\n\n:::checks{cite="m1"}\n');
      }),
      { numRuns: 100 },
    );
  });
});
