import { readBlock } from '../../shared/blocks/read-block.ts';
import type { SourceBlock } from '../../shared/blocks/source-table.ts';
import type { Block } from '../../shared/blocks/block.ts';
import { slugOf } from '../../shared/lib/slug.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { emptyFrontMatter } from '../../shared/pages/read-front-matter.ts';
import type { PageKind } from '../../shared/pages/page-kind.ts';
import type { PublishedText } from '../../shared/search/search-document-of.ts';
import {
  centreConnectors,
  frontConnectors,
  furtherCircuits,
  furtherEnds,
  madeChecks,
  madeComponents,
  madeWires,
  rearConnectors,
  type MadeCavity,
  type MadeConnector,
} from './made-loom.ts';
import { createDice, createWriter, madeWord, pick, type Dice } from './made-words.ts';

/** A page of the made corpus: its Markdown, and the same page as it is read. */
export interface MadePage {
  readonly address: PageAddress;
  readonly markdown: string;
  readonly text: PublishedText;
}

/** What the made corpus is measured at: about 1,000 pages with 27,000 lines. */
export const usualPages = 1000;

interface Donor {
  readonly slug: string;
  readonly title: string;
  readonly from: number;
  /** Colours by circuit; a maker's donors share most of them. */
  readonly colours: ReadonlyMap<string, string>;
  /** How its maker calls each circuit and each connector. */
  readonly names: (usual: string) => string;
  /** Its connectors' cavities in the order that this donor has them. */
  readonly cavities: ReadonlyMap<string, readonly MadeCavity[]>;
}

interface MadeSection {
  readonly heading: string;
  readonly text: string;
  readonly blocks: readonly SourceBlock[];
}

const letters = ['B', 'Br', 'G', 'Gr', 'L', 'Lg', 'O', 'P', 'R', 'Sb', 'V', 'W', 'Y'];
const vocabulary = 9000;

/**
 * Makes a corpus that is the same for the same seed: donors with a page of each kind, connectors whose circuits have
 * one maker's colours with some changed from model to model, and prose with as many words as a language has.
 */
export function* makeCorpus(pages = usualPages, seed = 20_240_503): Generator<MadePage> {
  const dice = createDice(seed);
  const write = createWriter(dice, vocabulary);
  const slugs = new Set<string>();
  let left = pages;
  while (left > 0) {
    const maker = capital(madeWord(dice, 2, 3));
    const ofMaker = new Map<string, string>();
    const names = makeNames(dice);
    for (let model = 4 + Math.floor(dice() * 8); model > 0 && left > 0; model -= 1) {
      const donor = makeDonor(dice, maker, ofMaker, names, slugs);
      for (const page of pagesOf(dice, write, donor)) {
        if (left === 0) break;
        left -= 1;
        yield page;
      }
    }
  }
}

function capital(word: string): string {
  return word.charAt(0).toUpperCase() + word.slice(1);
}

/** How a maker's manuals call things: mostly as everybody does. */
function makeNames(dice: Dice): (usual: string) => string {
  const chosen = new Map<string, string>();
  return (usual) => {
    const name =
      chosen.get(usual) ??
      pick(dice, [usual, usual, usual, `${usual} lead`, `${usual}, loom half`, `${usual} (${pick(dice, letters)})`]);
    chosen.set(usual, name);
    return name;
  };
}

const usualConnectors = [...frontConnectors, ...centreConnectors, ...rearConnectors];

function makeDonor(
  dice: Dice,
  maker: string,
  ofMaker: Map<string, string>,
  names: Donor['names'],
  slugs: Set<string>,
): Donor {
  let title = '';
  let slug = '';
  do {
    const code = Array.from({ length: 2 }, () => String.fromCharCode(65 + Math.floor(dice() * 26))).join('');
    title = `${maker} ${code}${pick(dice, ['125', '250', '350', '400', '500', '550', '650', '750', '900'])}`;
    slug = slugOf(title);
  } while (slugs.has(slug));
  slugs.add(slug);
  const orders = new Map(usualConnectors.map(({ id, cavities }) => [id, shuffled(dice, cavities)]));
  const cavities = new Map(usualConnectors.map(({ id }) => [id, cavitiesOf(dice, orders.get(id) ?? [], orders)]));
  const colours = new Map<string, string>();
  for (const { circuit } of [...cavities.values()].flat()) {
    if (!ofMaker.has(circuit)) ofMaker.set(circuit, makeColour(dice, circuit));
    if (!colours.has(circuit))
      colours.set(circuit, dice() < 0.12 ? makeColour(dice, circuit) : (ofMaker.get(circuit) ?? 'B'));
  }
  return { slug, title, from: 1968 + Math.floor(dice() * 24), colours, names, cavities };
}

function shuffled<Value>(dice: Dice, list: readonly Value[]): Value[] {
  return list
    .map((value) => ({ value, at: dice() }))
    .sort((a, b) => a.at - b.at)
    .map(({ value }) => value);
}

/** A donor's cavities: the usual ones leading to where the donor has them, and some that others lack. */
function cavitiesOf(
  dice: Dice,
  order: readonly MadeCavity[],
  orders: ReadonlyMap<string, readonly MadeCavity[]>,
): MadeCavity[] {
  const usual = order.map((cavity) => {
    const [id = '', number = ''] = cavity.goesTo.split('.');
    const target = usualConnectors.find((one) => one.id === id)?.cavities[Number(number) - 1];
    const at = target === undefined ? -1 : (orders.get(id)?.indexOf(target) ?? -1);
    return at < 0 ? cavity : { ...cavity, goesTo: `${id}.${at + 1}` };
  });
  const further = Array.from({ length: Math.floor(dice() * 6) }, () => ({
    circuit: pick(dice, furtherCircuits),
    goesTo: pick(dice, furtherEnds),
    size: pick(dice, ['0.5', '0.5', '0.85', '1.25']),
  }));
  return [...usual, ...further];
}

function makeColour(dice: Dice, circuit: string): string {
  if (/earth/i.test(circuit)) return dice() < 0.9 ? 'B' : 'Br';
  const base = pick(dice, letters);
  const tracer = pick(dice, letters);
  return dice() < 0.4 || base === tracer ? base : `${base}/${tracer}`;
}

function* pagesOf(dice: Dice, write: (words: number) => string, donor: Donor): Generator<MadePage> {
  const prose = (heading: string, words: number, ...blocks: SourceBlock[]): MadeSection => ({
    heading,
    text: write(words),
    blocks,
  });
  const connectors = (list: readonly MadeConnector[]): MadeSection[] =>
    list.filter(() => dice() < 0.97).map((one) => prose(donor.names(one.name), 60, connectorBlock(dice, donor, one)));
  const made = (page: string, title: string, kind: PageKind, sections: MadeSection[]): MadePage =>
    makePage(donor, page, title, kind, write(14), sections);
  const asides = (count: number): MadeSection[] =>
    Array.from({ length: count }, () => prose(capital(write(3).toLowerCase().replace('.', '')), 110));
  yield made('overview', donor.title, 'overview', [
    ...asides(5),
    prose('Where everything is', 120, componentsBlock(dice)),
  ]);
  yield made('pinouts-front', 'Front connectors', 'pinouts', [
    ...connectors(frontConnectors),
    prose('Going back together', 60),
  ]);
  yield made('pinouts-centre', 'Centre connectors', 'pinouts', [
    ...connectors(centreConnectors),
    prose('Heavy wires', 40, wiresBlock()),
  ]);
  yield made('pinouts-rear', 'Rear connectors', 'pinouts', [...connectors(rearConnectors), ...asides(2)]);
  yield made('quirks', 'Quirks', 'quirks', [hazardSection(dice, write), ...asides(7)]);
  yield made('checks', 'Checks', 'checks', [
    prose('Before you measure', 120),
    prose('What to expect', 60, checksBlock()),
    ...asides(4),
  ]);
}

function connectorBlock(dice: Dice, donor: Donor, { id, name, zone, layouts }: MadeConnector): SourceBlock {
  const rows: string[][] = [];
  const cavities = donor.cavities.get(id) ?? [];
  const changed = Math.floor(dice() * cavities.length * 6);
  cavities.forEach(({ circuit, goesTo, size }, at) => {
    const wire = donor.colours.get(circuit) ?? 'B';
    const row = (colour: string, years: string): string[] => [
      String(at + 1),
      colour,
      size,
      donor.names(circuit),
      goesTo,
      years,
    ];
    if (at === changed) {
      const year = donor.from + 2;
      rows.push(row(wire, `${donor.from}-${year - 1}`), row(makeColour(dice, circuit), `${year}-`));
    } else rows.push(row(wire, ''));
  });
  const oriented = dice() < 0.8;
  return block('connector', {
    id,
    attributes: {
      name: donor.names(name),
      zone,
      layout: layouts.find((layout) => seatCount(layout) >= cavities.length) ?? String(cavities.length),
      seen: dice() < 0.8 ? 'wire side' : 'mating side',
      ...(oriented ? { first: 'top left', latch: pick(dice, ['top', 'left']) } : {}),
      contacts: pick(dice, ['pins', 'sockets']),
      cite: pick(dice, ['m1', 'm1', 'c1']),
    },
    headings: ['Cavity', 'Wire', 'mm²', 'Circuit', 'Goes to', 'Years'],
    rows,
  });
}

function seatCount(layout: string): number {
  const grid = /^(\d+)x(\d+)$/.exec(layout);
  return grid === null
    ? layout.split('+').reduce((sum, row) => sum + Number(row), 0)
    : Number(grid[1]) * Number(grid[2]);
}

function componentsBlock(dice: Dice): SourceBlock {
  return block('components', {
    id: null,
    attributes: { cite: 'm1' },
    headings: ['Id', 'Kind', 'Name', 'Rating', 'Earthed by'],
    rows: madeComponents
      .filter(() => dice() < 0.95)
      .map((component) => [...component, component[1] === 'load' && dice() < 0.3 ? 'frame' : '']),
  });
}

function wiresBlock(): SourceBlock {
  const rows = madeWires.map(([from, to, size, length]) => [
    from,
    to,
    /frame|engine/.test(to) ? 'B' : 'R',
    size,
    length,
  ]);
  return block('wires', {
    id: null,
    attributes: { cite: 'm1' },
    headings: ['From', 'To', 'Wire', 'mm²', 'Length m'],
    rows,
  });
}

function checksBlock(): SourceBlock {
  const rows = madeChecks.map((check) => [...check]);
  return block('checks', {
    id: null,
    attributes: { cite: 'c1' },
    headings: ['Check', 'Between', 'Expect', 'At'],
    rows,
  });
}

function hazardSection(dice: Dice, write: (words: number) => string): MadeSection {
  const of = pick(dice, ['battery', 'charging', 'starter', 'ignition']);
  const hazard: SourceBlock = {
    name: 'hazard',
    id: null,
    attributes: { signal: 'warning', of },
    table: null,
    text: write(30),
    line: 1,
    endLine: 3,
  };
  return { heading: 'Before you begin', text: write(30), blocks: [hazard] };
}

interface Written {
  readonly id: string | null;
  readonly attributes: Readonly<Record<string, string>>;
  readonly headings: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

function block(name: string, { id, attributes, headings, rows }: Written): SourceBlock {
  const table = { headings, rows: rows.map((cells, at) => ({ cells, line: at + 4 })), line: 2 };
  return { name, id, attributes, table, text: '', line: 1, endLine: rows.length + 4 };
}

function makePage(
  donor: Donor,
  page: string,
  title: string,
  kind: PageKind,
  summary: string,
  sections: readonly MadeSection[],
): MadePage {
  const address: PageAddress = { shelf: 'donors', subject: donor.slug, page };
  const sources = [
    { id: 'm1', kind: 'factory-manual', title: 'Workshop manual (made for measuring)', where: 'chapter 14' },
    { id: 'c1', kind: 'club-measurement', title: 'A loom on a bench (made for measuring)', where: 'sheet 2' },
  ] as const;
  const blocks = sections.flatMap((section) =>
    section.blocks
      .map((source) => readBlock(source, { colours: { name: 'jis' } }).block)
      .filter((one): one is Block => one !== null),
  );
  const text: PublishedText = {
    address,
    subjectTitle: donor.title,
    frontMatter: { ...emptyFrontMatter, title, kind, summary, sources },
    outline: sections.map(({ heading }, at) => ({
      level: 2,
      text: heading,
      id: `s-${slugOf(heading)}`,
      line: at + 20,
    })),
    sections: sections.map(({ heading, text }) => ({ id: `s-${slugOf(heading)}`, heading, text })),
    blocks,
  };
  const frontMatter = [
    '---',
    `title: ${title}`,
    `kind: ${kind}`,
    `summary: ${summary}`,
    'colours: jis',
    'sources:',
    ...sources.flatMap((source) => [
      `  - id: ${source.id}`,
      `    kind: ${source.kind}`,
      `    title: ${source.title}`,
      `    where: ${source.where}`,
    ]),
    '---',
    '',
  ];
  const body = sections.flatMap(({ heading, text, blocks: sources_ }) => [
    `## ${heading}`,
    '',
    text,
    '',
    ...sources_.flatMap((source) => [markdownOf(source), '']),
  ]);
  return { address, markdown: [...frontMatter, ...body].join('\n'), text };
}

function markdownOf({ name, id, attributes, table, text }: SourceBlock): string {
  const written = [
    id === null ? '' : `#${id}`,
    ...Object.entries(attributes).map(([key, value]) => `${key}="${value}"`),
  ].filter((part) => part !== '');
  const row = (cells: readonly string[]): string => `| ${cells.join(' | ')} |`;
  const lines =
    table === null
      ? [text]
      : [row(table.headings), row(table.headings.map(() => '--')), ...table.rows.map(({ cells }) => row(cells))];
  return [`:::${name}{${written.join(' ')}}`, ...lines, ':::'].join('\n');
}
