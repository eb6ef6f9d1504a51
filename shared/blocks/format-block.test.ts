import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sourceBlock } from '../../tests/factories/source-blocks.ts';
import { formatBlock } from './format-block.ts';
import { readBlock } from './read-block.ts';
import type { SourceBlock } from './source-table.ts';

const page = { colours: { name: 'jis' } } as const;

/** A value with its places in the text taken out: they are what formatting changes. */
function withoutLines(value: unknown): unknown {
  return JSON.parse(
    JSON.stringify(value, (name, part: unknown) => (name === 'line' || name === 'endLine' ? undefined : part)),
  );
}

describe('formatBlock', () => {
  it('aligns the table and leaves the directive as it is', () => {
    const text = [
      ':::connector{#headlight name="Headlight bucket" layout="3+4" seen="wire side" cite="m1"}',
      '|Cavity|Wire|Goes to|',
      '|-|-|-|',
      '|1|Y|dip-switch.Y|',
      '|2+|Y/R|tell-tale.+, a.b|',
      ':::',
    ].join('\n');
    expect(formatBlock(sourceBlock(text))).toBe(
      [
        ':::connector{#headlight name="Headlight bucket" layout="3+4" seen="wire side" cite="m1"}',
        '| Cavity | Wire | Goes to          |',
        '| ------ | ---- | ---------------- |',
        '| 1      | Y    | dip-switch.Y     |',
        '| 2+     | Y/R  | tell-tale.+, a.b |',
        ':::',
      ].join('\n'),
    );
  });

  it('writes a sum on one line and a caution with its words', () => {
    expect(formatBlock(sourceBlock('::calculator{name="wire-size" current="9"}'))).toBe(
      '::calculator{name="wire-size" current="9"}',
    );
    expect(formatBlock(sourceBlock(':::hazard{signal="warning"}\n\nHands *off*.\n\n:::'))).toBe(
      ':::hazard{signal="warning"}\nHands *off*.\n:::',
    );
  });

  it('gives a holder a longer fence than what it holds', () => {
    const text = '::::hazard{signal="danger"}\nFirst this.\n\n:::wires\n| From | To |\n| - | - |\n:::\n::::';
    const written = formatBlock({ ...sourceBlock(text), table: null, text: text.split('\n').slice(1, -1).join('\n') });
    expect(written).toBe(text);
  });

  it('keeps quotes, ampersands, empty values and attributes that nobody reads', () => {
    const text = `:::wires{#x a="1 & 2" b='he said "so"' c="" other-thing="&amp;lt;"}\n:::`;
    const source = sourceBlock(text);
    expect(sourceBlock(formatBlock(source))).toMatchObject({ id: 'x', attributes: source.attributes });
    expect(source.attributes).toEqual({ a: '1 & 2', b: 'he said "so"', c: '', 'other-thing': '&lt;' });
  });

  const cell = fc.oneof(
    fc.constantFrom(
      '1',
      '2',
      '2+',
      'Y/R',
      'BR',
      '0.85',
      '–',
      'blank',
      '●',
      'x',
      'battery.+',
      '1980-',
      'joins',
      '5–7 Ω',
      'a|b',
      'load',
    ),
    fc.stringMatching(/^[A-Za-z0-9/|. ●²-]{0,8}$/),
  );
  const heading = fc.constantFrom(
    'Cavity',
    'Wire',
    'mm²',
    'Goes to',
    'Id',
    'Kind',
    'Rating',
    'Position',
    'R',
    'From',
    'To',
    'As',
    'Check',
    'Between',
    'Expect',
    'Years',
    'Torque',
  );
  const attributes = fc.dictionary(
    fc.constantFrom('name', 'zone', 'layout', 'seen', 'first', 'role', 'rest', 'signal', 'of', 'cite', 'data-x'),
    fc.oneof(
      fc.constantFrom('2x3', 'wire side', 'top left', 'warning', 'battery', 'm1', 'Off', '&lt;', 'a "b" & \'c\''),
      fc.stringMatching(/^[\x20-\x7e●Ω]{0,12}$/),
    ),
  );
  const table = fc.record({
    headings: fc.array(heading, { minLength: 1, maxLength: 5 }),
    rows: fc.array(fc.array(cell, { maxLength: 6 }), { maxLength: 5 }),
  });
  const block = fc.record({
    name: fc.constantFrom('connector', 'components', 'switch', 'wires', 'inside', 'checks', 'hazard', 'calculator'),
    id: fc.option(fc.constantFrom('headlight', 'main-fuse', 'Bad_Id')),
    attributes,
    table: fc.option(table),
    text: fc.constantFrom('', 'Take the lead off.', 'One.\n\nTwo *three*.'),
  });

  it('loses nothing: what it writes is the same directive, and reads as the same block', () => {
    fc.assert(
      fc.property(block, ({ name, id, attributes: written, table: drawn, text }) => {
        const source = readable({ name, id, attributes: written, table: drawn, text });
        const again = sourceBlock(formatBlock(source));
        expect(withoutLines(again)).toEqual(withoutLines(source));
        expect(withoutLines(readBlock(again, page).block)).toEqual(withoutLines(readBlock(source, page).block));
        expect(formatBlock(again)).toBe(formatBlock(source));
      }),
      { numRuns: 300 },
    );
  });
});

/** A directive as a reader of source text gives it: trimmed cells, full rows. */
function readable(parts: {
  readonly name: string;
  readonly id: string | null;
  readonly attributes: Readonly<Record<string, string>>;
  readonly table: { readonly headings: readonly string[]; readonly rows: readonly (readonly string[])[] } | null;
  readonly text: string;
}): SourceBlock {
  const { table, ...rest } = parts;
  const width = table?.headings.length ?? 0;
  const rows = (table?.rows ?? []).map((cells, at) => ({
    cells: trimmed([...cells, ...Array.from({ length: Math.max(0, width - cells.length) }, () => '')], width),
    line: at + 4,
  }));
  return { ...rest, table: table === null ? null : { headings: table.headings, rows, line: 2 }, line: 1, endLine: 9 };
}

function trimmed(cells: readonly string[], width: number): readonly string[] {
  return cells
    .map((cell) => cell.trim())
    .slice(0, Math.max(width, cells.findLastIndex((cell) => cell.trim() !== '') + 1));
}
