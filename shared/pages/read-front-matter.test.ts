import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emptyFrontMatter, readFrontMatter } from './read-front-matter.ts';

const overview = `title: QF 550
kind: overview
summary: A twin that exists only here.
applies: {years: 1978-1981, markets: [UK, EU]}
colours: jis
wire-standard: thin-wall
sources:
  - {id: m1, kind: factory-manual, title: Workshop manual, where: page 12}
  - {id: c1, kind: club-measurement, title: Measured on one bike}
maker: Torimachi
model: QF 550
years: 1978-1981
markets: UK, EU
voltage: 12 V
battery: battery
earth: negative
`;

describe('readFrontMatter', () => {
  it('reads a page and its donor', () => {
    const { frontMatter, findings } = readFrontMatter(overview, 2);
    expect(findings).toEqual([]);
    expect(frontMatter).toEqual({
      title: 'QF 550',
      kind: 'overview',
      summary: 'A twin that exists only here.',
      applies: { years: [{ from: 1978, to: 1981 }], markets: ['UK', 'EU'], frames: [] },
      colours: { name: 'jis' },
      wireStandard: 'thin-wall',
      sources: [
        { id: 'm1', kind: 'factory-manual', title: 'Workshop manual', where: 'page 12' },
        { id: 'c1', kind: 'club-measurement', title: 'Measured on one bike', where: null },
      ],
      facts: {
        maker: 'Torimachi',
        model: 'QF 550',
        years: '1978-1981',
        markets: ['UK', 'EU'],
        voltage: '12 V',
        ignition: null,
        charging: null,
        battery: 'battery',
        earth: 'negative',
      },
    });
  });

  it('reads an empty one, and fields that are left out, without complaint', () => {
    expect(readFrontMatter('', 2)).toEqual({ frontMatter: emptyFrontMatter, findings: [] });
    expect(readFrontMatter('title: Notes', 2)).toEqual({
      frontMatter: { ...emptyFrontMatter, title: 'Notes' },
      findings: [],
    });
  });

  it('takes numbers for words where a field is one', () => {
    const { frontMatter } = readFrontMatter('title: 550\nvoltage: 6\napplies: {years: 1980}', 2);
    expect(frontMatter.title).toBe('550');
    expect(frontMatter.facts.voltage).toBe('6');
    expect(frontMatter.applies.years).toEqual([{ from: 1980, to: 1980 }]);
  });

  it("reads a page's own colour key, whose letters are letters and not yes and no", () => {
    const { frontMatter, findings } = readFrontMatter('colours: own\ncolour-key: {B: white, N: black, Y: gray}', 2);
    expect(findings).toEqual([]);
    expect(frontMatter.colours).toEqual({ name: 'own', key: { B: 'white', N: 'black', Y: 'grey' } });
  });

  it.each([
    ['kind: pinout', 1, /`kind: pinout` is not known.*pinouts/],
    ['title: x\ncolours: jiss', 2, /jis, din, bs-au7, iec, own/],
    ['title: x\nsummary: y\nwire-standard: thick', 3, /jis, thin-wall/],
    ['earth: both', 1, /negative, positive/],
    ['title: [a, b]', 1, /should be words/],
    ['applies: 1978-1981', 1, /should hold `years`/],
    ['applies: {years: late}', 1, /`late` cannot be read/],
    ['colours: own', 1, /needs a key/],
    ['colours: own\ncolour-key: {B: plaid}', 2, /`B` should be a colour/],
    ['sources: m1', 1, /should be a list/],
    ['sources: [{kind: standard}]', 1, /no id/],
    ['sources: [{id: m1, kind: hearsay}]', 1, /one of factory-manual/],
    ['sources: [{id: m1, kind: standard}, {id: m1, kind: standard}]', 1, /Two sources/],
    ['- a\n- b', 1, /no list of fields/],
    ['title: "open', 1, /cannot be read/],
    ['title: a: b', 1, /in quotes/],
    ['title: a\ntitle: b', 2, /cannot be read/],
  ])('says of %j what was expected, where it stands', (yaml, line, message) => {
    const { findings } = readFrontMatter(yaml, 2);
    expect(findings).toHaveLength(1);
    expect(findings[0]).toMatchObject({ code: 'block-unreadable', severity: 'stop', line: line + 1 });
    expect(findings[0]?.message).toMatch(message);
  });

  it('keeps the fields that could be read beside one that could not', () => {
    expect(readFrontMatter('title: QF 550\nkind: pinout', 2).frontMatter).toMatchObject({
      title: 'QF 550',
      kind: 'notes',
    });
  });

  it('never throws, and always says where', () => {
    const yaml = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.stringMatching(/^[a-c:{}[\],&*!#|> \n"'-]{0,60}$/),
      fc
        .dictionary(fc.constantFrom('title', 'kind', 'applies', 'sources', 'colours', 'colour-key'), fc.jsonValue())
        .map((fields) => JSON.stringify(fields)),
    );
    fc.assert(
      fc.property(yaml, (text) => {
        for (const { line, message } of readFrontMatter(text, 2).findings) {
          expect(line).toBeGreaterThanOrEqual(2);
          expect(message).not.toBe('');
        }
      }),
    );
  });
});
