import { describe, expect, it } from 'vitest';
import { sourceBlock } from '../../tests/factories/source-blocks.ts';
import type { Finding, FindingCode } from '../pages/finding.ts';
import type { FrontMatter } from '../pages/front-matter.ts';
import { emptyFrontMatter } from '../pages/read-front-matter.ts';
import type { Block } from './block.ts';
import { checkBlocks } from './check-blocks.ts';
import { readBlock } from './read-block.ts';

/** The blocks of several directives, each ten lines below the one before. */
function blocksOf(...directives: readonly string[]): readonly Block[] {
  return directives.flatMap((text, at) => {
    const moved = '\n'.repeat(at * 10) + text;
    const { block } = readBlock(sourceBlock(moved), { colours: { name: 'jis' } });
    return block === null ? [] : [block];
  });
}

interface Page {
  readonly frontMatter?: Partial<FrontMatter>;
  readonly elsewhere?: readonly { readonly id: string; readonly page: string }[];
  readonly headings?: readonly { readonly text: string; readonly line: number }[];
}

/** Findings of one code, so that a test about ids says nothing about sources. */
function found(code: FindingCode, directives: readonly string[], page: Page = {}): readonly Finding[] {
  const frontMatter = { ...emptyFrontMatter, ...page.frontMatter };
  const all = checkBlocks(
    blocksOf(...directives),
    frontMatter,
    { idsElsewhere: page.elsewhere ?? [] },
    page.headings ?? [],
  );
  return all.filter((finding) => finding.code === code);
}

function connector(id: string, layout: string, ...rows: readonly string[]): string {
  return [`:::connector{#${id} layout="${layout}"}`, '| Cavity | Wire | Years |', '| - | - | - |', ...rows, ':::'].join(
    '\n',
  );
}

function components(...rows: readonly string[]): string {
  return [':::components', '| Id | Kind | Years | Cite |', '| - | - | - | - |', ...rows, ':::'].join('\n');
}

describe('ids', () => {
  it('are each had by one thing of the page', () => {
    const findings = found('id-repeated', [
      connector('plug', '1'),
      ':::switch{#plug}\n| Position | a |\n| - | - |\n:::',
    ]);
    expect(findings).toMatchObject([{ severity: 'stop', line: 11, address: '#plug' }]);
    expect(findings[0]?.message).toMatch(/line 1/);
  });

  it('of components may stand side by side where their years never meet', () => {
    expect(found('id-repeated', [components('| horn | load | 1978-1979 |', '| horn | load | 1980- |')])).toEqual([]);
    const overlapping = found('id-repeated', [components('| horn | load | 1978-1980 |', '| horn | load | 1980- |')]);
    expect(overlapping).toMatchObject([{ line: 5, address: '#horn~1980-' }]);
  });

  it('say once that a component stands twice', () => {
    expect(found('id-repeated', [components('| horn | load |', '| horn | load |')])).toHaveLength(1);
  });

  it('are each had by one thing of the subject', () => {
    const elsewhere = [{ id: 'plug', page: 'pinouts-front' }];
    expect(found('id-repeated', [connector('plug', '1')], { elsewhere })).toMatchObject([
      { line: 1, address: '#plug' },
    ]);
    expect(found('id-repeated', [connector('socket', '1')], { elsewhere })).toEqual([]);
  });

  it("may be the donor's own on a page of safe modifications, where they take its place", () => {
    const elsewhere = [{ id: 'plug', page: 'pinouts-front' }];
    expect(found('id-repeated', [connector('plug', '1')], { elsewhere, frontMatter: { kind: 'safe-mods' } })).toEqual(
      [],
    );
    expect(
      found('id-repeated', [connector('plug', '1'), connector('plug', '1')], { frontMatter: { kind: 'safe-mods' } }),
    ).toHaveLength(1);
  });

  it('in an inside block name a component that stands elsewhere', () => {
    const unit = ':::inside{#unit}\n| From | To | As |\n| - | - | - |\n| 1 | 2 | joins |\n:::';
    expect(found('id-repeated', [components('| unit | module |'), unit], { elsewhere: [] })).toEqual([]);
    expect(found('id-repeated', [unit, unit])).toMatchObject([{ line: 14, address: '#unit@1--2' }]);
  });
});

describe('addresses of lines', () => {
  it('are each had by one line of the page', () => {
    const wires = ':::wires\n| From | To |\n| - | - |\n| a.1 | b.1 |\n:::';
    const back = ':::wires\n| From | To |\n| - | - |\n| b.1 | a.1 |\n:::';
    expect(found('id-repeated', [wires, back])).toMatchObject([{ severity: 'stop', line: 14, address: '#a.1--b.1' }]);
  });

  it('of further wires in a cavity differ by their pluses', () => {
    expect(found('id-repeated', [connector('plug', '1', '| 1 | Y |', '| 1+ | Y |', '| 1++ | Y |')])).toEqual([]);
    expect(found('id-repeated', [connector('plug', '1', '| 1 | Y |', '| 1+ | Y |', '| 1+ | R |')])).toMatchObject([
      { address: '#plug.1+' },
    ]);
  });
});

describe('cavities', () => {
  it('stand once, but for further wires and for rows that never meet', () => {
    const twice = connector('plug', '2', '| 1 | Y |', '| 1 | R |');
    expect(found('cavity-repeated', [twice])).toMatchObject([{ severity: 'stop', line: 5, address: '#plug.1' }]);
    expect(found('cavity-repeated', [connector('plug', '2', '| 1 | Y |', '| 1+ | R |')])).toEqual([]);
    expect(found('cavity-repeated', [connector('plug', '2', '| 1 | Y | 1978-1979 |', '| 1 | R | 1980- |')])).toEqual(
      [],
    );
    expect(
      found('cavity-repeated', [connector('plug', '2', '| 1 | Y | 1978-1980 |', '| 1 | R | 1980- |')]),
    ).toHaveLength(1);
    expect(found('cavity-repeated', [connector('plug', '2', '| 1 | Y |', '| 1 | R | 1980- |')])).toHaveLength(1);
  });

  it('are on the face, by their number or by their place in the table', () => {
    expect(found('cavity-outside-face', [connector('plug', '2', '| 1 | Y |', '| 2 | R |')])).toEqual([]);
    const beyond = found('cavity-outside-face', [connector('plug', '2', '| 3 | Y |', '| 3+ | R |')]);
    expect(beyond).toMatchObject([{ severity: 'stop', line: 4, address: '#plug.3' }]);
    expect(beyond[0]?.message).toMatch(/2 cavities/);
    expect(found('cavity-outside-face', [connector('plug', '1', '| A | Y |', '| B | R |')])).toMatchObject([
      { line: 5 },
    ]);
  });
});

describe('switches on one shaft', () => {
  function onShaft(id: string, positions: readonly string[], movesWith = ''): string {
    return [
      `:::switch{#${id} moves-with="${movesWith}"}`,
      '| Position | a | b |',
      '| - | - | - |',
      ...positions.map((name) => `| ${name} |`),
      ':::',
    ].join('\n');
  }

  it('have the same positions, by the same names', () => {
    expect(found('block-unreadable', [onShaft('one', ['Off', 'On'], 'two'), onShaft('two', ['ON', 'off'])])).toEqual(
      [],
    );
    const different = found('block-unreadable', [onShaft('one', ['Off', 'On'], 'two'), onShaft('two', ['Off', 'Run'])]);
    expect(different).toMatchObject([{ severity: 'stop', line: 1, address: '#one' }]);
    expect(different[0]?.message).toMatch(/“On” of `one`.*“Run” of `two`/);
  });

  it('are switches, and not the same one', () => {
    expect(found('block-unreadable', [onShaft('one', ['On'], 'plug'), connector('plug', '1')])).toHaveLength(1);
    expect(found('block-unreadable', [onShaft('one', ['On'], 'one')])).toHaveLength(1);
  });

  it('may stand on another page, where this one cannot look', () => {
    expect(found('block-unreadable', [onShaft('one', ['On'], 'elsewhere')])).toEqual([]);
  });
});

describe('sources', () => {
  const sources = [{ id: 'm1', kind: 'factory-manual', title: 'Manual', where: null }] as const;

  it('are named by a block, or by every one of its rows', () => {
    const cited = ':::wires{cite="m1"}\n| From | To |\n| - | - |\n| a.1 | b.1 |\n:::';
    expect(found('uncited', [cited], { frontMatter: { sources } })).toEqual([]);
    expect(found('uncited', [components('| horn | load | | m1 |')], { frontMatter: { sources } })).toEqual([]);
    const half = found('uncited', [components('| horn | load | | m1 |', '| frame | earth | | |')], {
      frontMatter: { sources },
    });
    expect(half).toMatchObject([{ severity: 'hint', line: 1, address: '#horn' }]);
  });

  it('of the page do not cite its blocks', () => {
    expect(found('uncited', [connector('plug', '1', '| 1 | Y |')], { frontMatter: { sources } })).toHaveLength(1);
  });

  it('are listed on the page', () => {
    const [finding] = found('uncited', [':::wires{cite="m1, m9"}\n| From | To |\n| - | - |\n| a.1 | b.1 |\n:::'], {
      frontMatter: { sources },
    });
    expect(finding?.message).toMatch(/cites `m9`, which the page does not list/);
  });

  it('are not asked of a block without lines', () => {
    expect(found('uncited', [connector('plug', '1'), '::calculator{name="x"}'])).toEqual([]);
  });
});

describe('cautions', () => {
  const battery = components('| battery | battery |', '| coil | ignition-coil |');

  it('are asked for once a hazard, where the page first touches it', () => {
    const findings = found('caution-missing', [connector('plug', '1'), battery], {
      headings: [{ text: 'The battery', line: 4 }],
    });
    expect(findings.map(({ severity, line, address }) => [severity, line, address])).toEqual([
      ['warn', 4, undefined],
      ['warn', 11, '#battery'],
    ]);
    expect(findings[0]?.message).toMatch(/“The battery”.*of="battery"/);
  });

  it('are answered by a hazard block that says what it is of, or whose words do', () => {
    expect(
      found('caution-missing', [battery, ':::hazard{signal="warning" of="battery, ignition"}\nMind.\n:::']),
    ).toEqual([]);
    expect(
      found('caution-missing', [battery, ':::hazard{signal="warning"}\nBattery off before the ignition coil.\n:::']),
    ).toEqual([]);
    expect(
      found('caution-missing', [
        battery,
        ':::hazard{signal="warning" of="fuel"}\nThe battery and the ignition coil.\n:::',
      ]),
    ).toHaveLength(2);
  });

  it('are asked for by the title of the page, and not by its prose', () => {
    expect(found('caution-missing', [], { frontMatter: { title: 'Another regulator' } })).toMatchObject([{ line: 1 }]);
    expect(found('caution-missing', [connector('plug', '1')], { frontMatter: { summary: 'The regulator.' } })).toEqual(
      [],
    );
  });
});

it('gives findings in the order of the lines that they are about', () => {
  const all = checkBlocks(
    blocksOf(connector('plug', '1', '| 1 | Y |', '| 1 | Y |', '| 9 | Y |'), components('| plug | load |')),
    emptyFrontMatter,
    { idsElsewhere: [] },
    [],
  );
  const lines = all.map(({ line }) => line);
  expect(lines).toEqual(lines.toSorted((a, b) => a - b));
  expect(lines.length).toBeGreaterThan(3);
});
