import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pageFindingSeverities } from '../pages/finding.ts';
import { linesOf } from './lines.ts';
import { isBlockName, readBlock } from './read-block.ts';

const names = ['connector', 'components', 'switch', 'wires', 'inside', 'checks', 'hazard', 'calculator'];

describe('readBlock', () => {
  it('knows its own directives and no others', () => {
    for (const name of names) expect(isBlockName(name)).toBe(true);
    for (const name of ['note', 'Connector', 'constructor', 'toString', '']) {
      expect(isBlockName(name)).toBe(false);
      const source = { name, id: null, attributes: {}, table: null, text: '', line: 1, endLine: 2 };
      expect(readBlock(source, { colours: { name: 'jis' } })).toEqual({ block: null, findings: [] });
    }
  });

  const text = fc.oneof(
    fc.string({ unit: 'binary', maxLength: 30 }),
    fc.constantFrom(
      'headlight',
      'check',
      '2x3',
      'top left',
      '1',
      '2+',
      'BR',
      'Y/R',
      '●',
      'fuse',
      'a.1',
      'joins',
      '5–7 Ω',
      '1980-',
      'warning',
      '–',
    ),
  );
  const heading = fc.oneof(
    text,
    fc.constantFrom(
      'Cavity',
      'Wire',
      'mm²',
      'Goes to',
      'Id',
      'Kind',
      'Position',
      'From',
      'To',
      'As',
      'Check',
      'Expect',
      'Between',
      'Years',
      'Cite',
    ),
  );
  const source = fc.record({
    name: fc.constantFrom(...names),
    id: fc.option(text),
    attributes: fc.dictionary(
      fc.oneof(text, fc.constantFrom('layout', 'seen', 'first', 'signal', 'of', 'name', 'rest', 'sprung', 'colours')),
      text,
    ),
    table: fc.option(
      fc.record({
        headings: fc.array(heading, { minLength: 1, maxLength: 6 }),
        rows: fc.array(fc.record({ cells: fc.array(text, { maxLength: 8 }), line: fc.integer({ min: 3, max: 50 }) }), {
          maxLength: 6,
        }),
        line: fc.constant(2),
      }),
    ),
    text: fc.string({ unit: 'binary' }),
    line: fc.constant(1),
    endLine: fc.constant(60),
  });

  it('never throws, and loses no row: each is a line or is kept as unread', () => {
    fc.assert(
      fc.property(source, (directive) => {
        const { block, findings } = readBlock(directive, { colours: { name: 'jis' } });
        for (const finding of findings) {
          expect(finding.severity).toBe(pageFindingSeverities[finding.code]);
          expect(finding.message).not.toBe('');
          expect(finding.address ?? '#').toMatch(/^#/);
        }
        if (block === null) expect(findings).not.toEqual([]);
        else if (block.kind !== 'hazard' && block.kind !== 'calculator') {
          expect(linesOf(block).length + (block.unreadRows?.length ?? 0)).toBe(directive.table?.rows.length);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('gives lines whose addresses hold no white space, and plain data that survives JSON', () => {
    fc.assert(
      fc.property(source, (directive) => {
        const { block } = readBlock(directive, { colours: { name: 'jis' } });
        if (block === null) return;
        expect(JSON.parse(JSON.stringify(block))).toEqual(block);
        for (const { address, cells } of linesOf(block)) {
          expect(address).toMatch(/^\S+$/);
          expect(cells).toHaveLength(directive.table?.headings.length ?? 0);
        }
      }),
      { numRuns: 500 },
    );
  });
});
