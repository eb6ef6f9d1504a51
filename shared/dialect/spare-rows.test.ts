import { describe, expect, it } from 'vitest';
import { readPage } from './read-page.ts';
import { sourceLines } from './source-lines.ts';
import { spareRows } from './spare-rows.ts';

const rows = '| Cavity | Wire | Circuit |\n| --- | --- | --- |\n| 1 | Y/R | Main beam |\n| 2 | B | Earth |';
const opening = ':::connector{#plug layout="2" seen="wire side"}';

function emptied(markdown: string): string | null {
  return spareRows(markdown, sourceLines(markdown))?.markdown ?? null;
}

/** Everything that is shown of a page besides its blocks. */
function shown(markdown: string): string {
  const page = readPage(markdown);
  if (!page.ok) throw new Error(page.refusal.message);
  return JSON.stringify(page.value.tree);
}

describe('sparing the parser the rows of blocks', () => {
  it('empties the rows of a block’s table, and keeps every line and its break', () => {
    const text = `Before.\r\n\r\n${opening}\r\n${rows.replaceAll('\n', '\r\n')}\r\n:::\n\n| a |\n| - |\n| b |\n`;
    const heading = '| Cavity | Wire | Circuit |\r\n| --- | --- | --- |\r\n';
    expect(emptied(text)).toBe(`Before.\r\n\r\n${opening}\r\n${heading}|\r\n|\r\n:::\n\n| a |\n| - |\n| b |\n`);
  });

  it('leaves a caution’s table alone, which is shown as it is parsed', () => {
    expect(emptied(`:::hazard{signal="warning" of="battery"}\n${rows}\n:::\n`)).toBeNull();
  });

  it('reads the lines of a block whose rows the parser did not see', () => {
    const page = readPage(`${opening}\n${rows}\n:::\n`);
    if (!page.ok) throw new Error(page.refusal.message);
    const [connector] = page.value.blocks;
    expect(connector?.kind === 'connector' && connector.lines.map(({ circuit }) => circuit)).toEqual([
      'Main beam',
      'Earth',
    ]);
    expect(shown(`${opening}\n${rows}\n:::\n`)).not.toContain('Main beam');
  });

  it.each([
    ['in code', `\`\`\`\n${opening}\n${rows}\n:::\n\`\`\`\n`],
    ['in a block’s second table', `${opening}\n${rows.replaceAll('Main beam', 'Dip beam')}\n\n${rows}\n:::\n`],
    ['in a block that cannot be read', `${opening}\n${rows.replace('Cavity', 'Place')}\n:::\n`],
    ['in a block whose attributes cannot be read', `:::connector{#plug layout="2}\n${rows}\n:::\n`],
    ['that no heading makes a table', `${opening}\nText.\n| --- | --- |\n| 1 | Main beam |\n:::\n`],
  ])('shows rows %s as they are written', (_where, markdown) => {
    expect(shown(markdown)).toContain('Main beam');
  });
});
