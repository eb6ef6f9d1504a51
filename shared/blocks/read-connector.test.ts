import { describe, expect, it } from 'vitest';
import { blockOf, findingsOf } from '../../tests/factories/source-blocks.ts';
import type { ColourSystem } from '../wire-colours/colour-system.ts';

const attributes = 'layout="3+4" seen="wire side" first="top left"';

function connector(
  rows: readonly string[],
  heading = '| Cavity | Wire | mm² | Circuit | Goes to | Years |',
  more = attributes,
): string {
  const columns = heading.split('|').length - 2;
  return [`:::connector{#headlight ${more}}`, heading, `|${' - |'.repeat(columns)}`, ...rows, ':::'].join('\n');
}

describe('a connector', () => {
  it('reads its face and its lines', () => {
    const { block, findings } = blockOf(
      'connector',
      [
        ':::connector{#headlight name="Headlight bucket" zone="headlight" layout="3+4" seen="wire side" first="top left" latch="top" contacts="sockets" housing="white" terminals="bullet" mates="headlight-lamp" cite="m1"}',
        '| Cavity | Wire | mm² | Circuit | Goes to | Years | Note | Torque |',
        '| - | - | - | - | - | - | - | - |',
        '| 1 | Y | 0.85 | Dip beam | dip-switch.Y | | | 2 Nm |',
        '| 2 | Y/R | 0.85 | Main beam | dip-switch.YR, main-lamp.+ | 1980- | | |',
        '| 2+ | Y/R | 0.5 | Tell-tale | tell-tale.+ | | second wire | |',
        ':::',
      ].join('\n'),
    );
    expect(findings).toEqual([]);
    expect(block).toMatchObject({
      kind: 'connector',
      id: 'headlight',
      name: 'Headlight bucket',
      zone: 'headlight',
      layout: {
        kind: 'rows',
        rows: [
          [true, true, true],
          [true, true, true, true],
        ],
      },
      seen: 'wire side',
      first: 'top left',
      latch: 'top',
      contacts: 'sockets',
      housing: 'white',
      terminals: 'bullet',
      mates: 'headlight-lamp',
      cite: 'm1',
      line: 1,
      endLine: 7,
      otherAttributes: {},
    });
    expect(block.columns.at(-1)).toEqual({ heading: 'Torque', role: null });
    expect(block.lines.map(({ address }) => address)).toEqual(['headlight.1', 'headlight.2~1980-', 'headlight.2+']);
    expect(block.lines[1]).toEqual({
      address: 'headlight.2~1980-',
      line: 5,
      applies: { years: [{ from: 1980, to: null }], markets: [], frames: [] },
      cells: ['2', 'Y/R', '0.85', 'Main beam', 'dip-switch.YR, main-lamp.+', '1980-', '', ''],
      note: null,
      cite: 'm1',
      cavity: '2',
      further: 0,
      blank: false,
      capped: false,
      wire: { written: 'Y/R', reading: { kind: 'read', colour: { base: 'yellow', tracer: 'red' } } },
      size: { written: '0.85', squareMillimetres: 0.85 },
      circuit: 'Main beam',
      goesTo: [
        { id: 'dip-switch', terminal: 'YR' },
        { id: 'main-lamp', terminal: '+' },
      ],
    });
  });

  it('gives a cavity that changed with the years, and a wire that did not, an address each', () => {
    const { block } = blockOf(
      'connector',
      connector(['| 2 | Y/R | | | | 1978-1979 |', '| 2 | Y/B | | | | 1980- |', '| 2+ | Y | | | | |']),
    );
    expect(block.lines.map(({ address }) => address)).toEqual([
      'headlight.2~1978-1979',
      'headlight.2~1980-',
      'headlight.2+',
    ]);
    expect(block.lines.map(({ cavity }) => cavity)).toEqual(['2', '2', '2']);
  });

  it('counts pluses only below the cavity that they belong to', () => {
    const { block } = blockOf(
      'connector',
      connector(['| B+ | R |', '| 2+ | Y |', '| 2 | Y |', '| 2++ | Y |', '| B++ | R |']),
    );
    expect(block.lines.map(({ cavity, further }) => [cavity, further])).toEqual([
      ['B+', 0],
      ['2+', 0],
      ['2', 0],
      // Below both `2` and `2+`, two pluses are the third wire in 2.
      ['2', 2],
      ['B+', 1],
    ]);
  });

  it.each([
    '| 3 | – | | | |',
    '| 3 | - |',
    '| 3 | blank |',
    '| 3 | – | | blank | |',
    '| 3 | | | blank | |',
    '| 3 | | | | blank |',
  ])('takes %s for an empty cavity', (row) => {
    expect(blockOf('connector', connector([row])).block.lines[0]).toMatchObject({ blank: true, wire: null });
  });

  it('takes no row for an empty cavity that names an end, or says nothing at all', () => {
    expect(blockOf('connector', connector(['| 3 | – | | | horn.+ |'])).block.lines[0]).toMatchObject({
      blank: false,
      wire: null,
    });
    expect(blockOf('connector', connector(['| 3 | | | | |'])).block.lines[0]).toMatchObject({
      blank: false,
      wire: null,
    });
  });

  it('knows a lead that ends capped', () => {
    expect(blockOf('connector', connector(['| 3 | R | | | capped |'])).block.lines[0]).toMatchObject({
      capped: true,
      blank: false,
      goesTo: [],
    });
  });

  it("goes by its own colour system before its page's", () => {
    const own = blockOf('connector', connector(['| 1 | BURD |'], undefined, `${attributes} colours="iec"`));
    expect(own.block.colours).toEqual({ name: 'iec' });
    expect(own.block.lines[0]?.wire?.reading).toMatchObject({ colour: { base: 'blue', tracer: 'red' } });
    const key: ColourSystem = { name: 'own', key: { B: 'white' } };
    expect(
      blockOf('connector', connector(['| 1 | B |'], undefined, `${attributes} colours="own"`), key).findings,
    ).toEqual([]);
    expect(findingsOf(connector([], undefined, `${attributes} colours="own"`))[0]?.message).toMatch(/page has no key/);
    expect(findingsOf(connector([], undefined, `${attributes} colours="ral"`))[0]?.message).toMatch(
      /jis, din, bs-au7, iec/,
    );
  });

  it('says of a colour that it is in no table, and in whose it would be', () => {
    const [finding, ...others] = blockOf('connector', connector(['| 1 | BURD |'])).findings;
    expect(others).toEqual([]);
    expect(finding).toMatchObject({ code: 'colour-unknown', severity: 'warn', line: 4, address: '#headlight.1' });
    expect(finding?.message).toMatch(/In IEC 60757 it is blue, red tracer.*colours="iec"/);
  });

  it('says of a colour that it may be one or two', () => {
    const [finding] = blockOf('connector', connector(['| 1 | BR |'])).findings;
    expect(finding).toMatchObject({ code: 'colour-ambiguous', severity: 'warn', address: '#headlight.1' });
    expect(finding?.message).toMatch(/brown; or black, red tracer/);
  });

  it('is readable and empty where its table has headings only', () => {
    const { block, findings } = blockOf('connector', connector([]));
    expect(findings).toEqual([]);
    expect(block.lines).toEqual([]);
    expect(block).not.toHaveProperty('unreadRows');
  });

  it('keeps attributes that it does not read', () => {
    expect(blockOf('connector', connector([], undefined, `${attributes} photo="p1"`)).block.otherAttributes).toEqual({
      photo: 'p1',
    });
  });

  it('keeps a row that names no cavity apart, with a finding', () => {
    const { block, findings } = blockOf('connector', connector(['| 1 | Y |', '| | Y/R |']));
    expect(block.lines).toHaveLength(1);
    expect(block.unreadRows).toEqual([{ cells: ['', 'Y/R', '', '', '', ''], line: 5 }]);
    expect(findings).toMatchObject([{ code: 'block-unreadable', severity: 'stop', line: 5, address: '#headlight' }]);
  });

  it.each([
    ['no id', ':::connector{layout="2"}\n| Cavity |\n| - |\n:::', /no id/],
    ['an id in capitals', ':::connector{#Headlight layout="2"}\n| Cavity |\n| - |\n:::', /no terminal can be named by/],
    ['the id check', ':::connector{#check layout="2"}\n| Cavity |\n| - |\n:::', /not `check`/],
    ["a heading's id", ':::connector{#s-head layout="2"}\n| Cavity |\n| - |\n:::', /not beginning with `s-`/],
    ['no table', ':::connector{#plug layout="2"}\nwords\n:::', /no table/],
    ['no column for cavities', ':::connector{#plug layout="2"}\n| Wire |\n| - |\n:::', /`Cavity` \(or `Pin`\)/],
  ])('cannot be read with %s, and says what is missing', (_, text, message) => {
    const findings = findingsOf(text);
    expect(findings).toHaveLength(1);
    expect(findings[0]).toMatchObject({ code: 'block-unreadable', severity: 'stop' });
    expect(findings[0]?.message).toMatch(message);
  });

  it.each([
    ['layout="square" seen="wire side"', /2x3.*3\+4.*round 6/],
    ['layout="2" seen="front" first="top left"', /wire side, mating side/],
    ['layout="2" seen="wire side" first="upper left"', /top left, top right/],
    ['layout="2" seen="wire side" first="top left" latch="middle"', /top, bottom, left, right/],
    ['layout="2" seen="wire side" first="top left" contacts="holes"', /pins, sockets/],
  ])('is read without what %s gets wrong, and says what was expected', (wrong, message) => {
    const { findings } = blockOf('connector', connector(['| 1 | Y |'], undefined, wrong));
    const [finding] = findings.filter(({ code }) => code === 'block-unreadable');
    expect(finding).toMatchObject({ severity: 'stop', line: 1, address: '#headlight' });
    expect(finding?.message).toMatch(message);
  });

  it.each(['late', '1981-1978'])('says of the years %j that they cannot be read', (years) => {
    const { findings } = blockOf('connector', connector([`| 1 | Y | | | | ${years} |`]));
    expect(findings).toMatchObject([{ code: 'block-unreadable', line: 4, address: '#headlight.1' }]);
  });

  it('says of a size that it cannot be read, but lets ? stand for not known', () => {
    expect(blockOf('connector', connector(['| 1 | Y | thick |'])).findings).toMatchObject([
      { code: 'block-unreadable', line: 4 },
    ]);
    expect(blockOf('connector', connector(['| 1 | Y | ? |'])).findings).toEqual([]);
  });

  it('says that a row has more cells than headings', () => {
    const { findings } = blockOf('connector', connector(['| 1 | Y | 0.85 | a | b.c | | lost |']));
    expect(findings).toMatchObject([{ code: 'block-unreadable', line: 4 }]);
    expect(findings[0]?.message).toMatch(/\\\|/);
  });
});

describe("a face's numbering", () => {
  function hints(more: string): readonly string[] {
    const { findings } = blockOf('connector', connector(['| 1 | Y |'], undefined, more));
    return findings.filter(({ code }) => code === 'face-unoriented').map(({ message }) => message);
  }

  it('is confirmed where layout, side and first cavity are said', () => {
    expect(hints(attributes)).toEqual([]);
    expect(hints('layout="2×3" seen="Mating-Side" first="bottom_right"')).toEqual([]);
  });

  it('is not confirmed where any of them is missing', () => {
    expect(hints('layout="2" seen="wire side"')).toEqual([expect.stringMatching(/where its first cavity is/)]);
    expect(hints('layout="2" first="top left"')).toEqual([expect.stringMatching(/from which side/)]);
    expect(hints('seen="wire side" first="top left"')).toEqual([expect.stringMatching(/layout/)]);
  });

  it('counts for nothing without a side or a layout: a mirrored face would lead to the wrong cavity', () => {
    expect(blockOf('connector', connector([], undefined, 'layout="2" first="top left"')).block.first).toBeNull();
    const guessed = blockOf(
      'connector',
      connector(['| 1 | Y |', '| 1+ | Y |', '| 2 | Y |'], undefined, 'seen="wire side" first="top left"'),
    ).block;
    expect(guessed.first).toBeNull();
    expect(guessed.layout).toEqual({ kind: 'rows', rows: [[true, true]] });
  });
});
