import {
  signalWords,
  type Block,
  type ConnectorBlock,
  type HazardBlock,
  type InsideLine,
  type Line,
  type SwitchLine,
  type TableBlock,
  type WrittenColour,
} from '../blocks/block.ts';
import { bookCautions } from '../blocks/book-cautions.ts';
import { citedIds } from '../blocks/check-sources.ts';
import type { FaceLayout } from '../blocks/face-layout.ts';
import { hazardsOf, hazardsTouchedByLine } from '../blocks/hazards.ts';
import { tableBlocks } from '../blocks/lines.ts';
import type { OutlineEntry, Section } from '../dialect/page-text.ts';
import type { PageAddress } from '../pages/address.ts';
import type { FrontMatter, Source } from '../pages/front-matter.ts';
import type { ColourReading } from '../wire-colours/colour-system.ts';
import type {
  IndexedColour,
  SearchDocument,
  SearchFace,
  SearchHazard,
  SearchHolder,
  SearchLine,
  SearchSection,
} from './search-document.ts';

/** What the search needs of a published page: its text, read, and where it stands. */
export interface PublishedText {
  readonly address: PageAddress;
  readonly subjectTitle: string;
  readonly frontMatter: FrontMatter;
  readonly outline: readonly OutlineEntry[];
  readonly sections: readonly Section[];
  readonly blocks: readonly Block[];
}

/** Makes of a published page what the search indexes. */
export function searchDocumentOf(page: PublishedText): SearchDocument {
  const { address, subjectTitle, frontMatter, blocks } = page;
  const hazards: SearchHazard[] = [];
  const cautions = blocks.filter((block): block is HazardBlock => block.kind === 'hazard');
  const citing = new Set(frontMatter.sources.filter(isAuthority).map(({ id }) => id));
  return {
    address,
    subjectTitle,
    title: frontMatter.title,
    kind: frontMatter.kind,
    summary: frontMatter.summary,
    holders: tableBlocks(blocks).map((block) => holderOf(block, cautions, hazards, citing)),
    hazards,
    sections: sectionsOf(page),
  };
}

/** A source that makes the lines that cite it `cited`. */
function isAuthority({ kind }: Source): boolean {
  return kind === 'factory-manual' || kind === 'standard';
}

/** The sections with their prose; a heading without any keeps its place, since it can be looked for as well. */
function sectionsOf({ outline, sections }: PublishedText): SearchSection[] {
  const texts = new Map(sections.map(({ id, text }) => [id, text]));
  const opening = texts.get('') ?? '';
  return [
    ...(opening === '' ? [] : [{ id: '', heading: '', text: opening }]),
    ...outline.map(({ id, text }) => ({ id, heading: text, text: texts.get(id) ?? '' })),
  ];
}

function holderOf(
  block: TableBlock,
  cautions: readonly HazardBlock[],
  hazards: SearchHazard[],
  citing: ReadonlySet<string>,
): SearchHolder {
  const rest = (line: Line): Pick<SearchLine, 'address' | 'applies' | 'cited' | 'hazard'> => ({
    address: line.address,
    applies: line.applies,
    cited: citedIds(line.cite).some((id) => citing.has(id)),
    hazard: placeOf(hazards, worstHazard(block, line, cautions)),
  });
  return {
    kind: block.kind,
    id: block.id ?? '',
    name: block.name ?? '',
    zone: 'zone' in block ? (block.zone ?? '') : '',
    face: block.kind === 'connector' ? faceOf(block) : null,
    lines: linesIn(block, rest),
  };
}

const plainLine = { text: '', detail: '', colour: null, size: null, goesTo: [], state: 'plain' } as const;

function linesIn(
  block: TableBlock,
  rest: (line: Line) => Pick<SearchLine, 'address' | 'applies' | 'cited' | 'hazard'>,
): SearchLine[] {
  switch (block.kind) {
    case 'connector':
      return block.lines.map((line) => ({
        ...plainLine,
        own: line.cavity + '+'.repeat(line.further),
        text: line.blank ? '' : (line.circuit ?? line.note ?? ''),
        colour: colourOf(line.wire),
        size: line.size?.written ?? null,
        goesTo: line.goesTo,
        state: line.blank ? 'blank' : line.capped ? 'capped' : 'plain',
        ...rest(line),
      }));
    case 'components':
      return block.lines.map((line) => ({
        ...plainLine,
        own: line.id,
        text: line.name ?? line.id.replace(/-/g, ' '),
        detail: [line.componentKind.replace(/-/g, ' '), line.rating?.written ?? '']
          .filter((part) => part !== '')
          .join(', '),
        goesTo: line.earthedBy === null ? [] : [{ id: line.earthedBy.earth, terminal: null }],
        ...rest(line),
      }));
    case 'switch':
      return block.lines.map((line) => ({
        ...plainLine,
        own: line.position,
        text: line.position,
        detail: joinedWords(line),
        ...rest(line),
      }));
    case 'wires':
      return block.lines.map((line) => ({
        ...plainLine,
        own: '',
        text: line.circuit ?? line.note ?? '',
        detail: line.lengthMetres === null ? '' : `${line.lengthMetres} m`,
        colour: colourOf(line.wire),
        size: line.size?.written ?? null,
        goesTo: [line.from, line.to],
        state: line.removed ? 'removed' : 'plain',
        ...rest(line),
      }));
    case 'inside':
      return block.lines.map((line) => ({
        ...plainLine,
        own: line.to === null ? line.from : `${line.from}--${line.to}`,
        detail: insideWords(line),
        ...rest(line),
      }));
    case 'checks':
      return block.lines.map((line) => ({
        ...plainLine,
        own: '',
        text: line.check,
        detail: `${line.between}: ${line.expectWritten}${line.at === null ? '' : ` at ${line.at}`}`,
        goesTo: line.terminals,
        ...rest(line),
      }));
  }
}

function colourOf(wire: WrittenColour | null): IndexedColour | null {
  return wire === null ? null : { code: wire.written, readings: readingsOf(wire.reading) };
}

function readingsOf(reading: ColourReading): IndexedColour['readings'] {
  if (reading.kind === 'unknown') return [];
  return reading.kind === 'read' ? [reading.colour] : [reading.colour, ...reading.others];
}

function joinedWords({ joined }: SwitchLine): string {
  return joined.length === 0 ? 'joins nothing' : joined.map((group) => group.join('–')).join(', ');
}

function insideWords({ from, to, as, when }: InsideLine): string {
  const what =
    as.kind === 'resistor' ? `resistor ${as.ohms} Ω` : as.kind === 'output' ? `output ${as.amps} A` : as.kind;
  const ends = to === null ? from : `${from} to ${to}`;
  if (when === null) return `${ends}: ${what}`;
  return `${ends}: ${what} when ${when.kind === 'words' ? when.words : `${when.terminal} at ${when.at}`}`;
}

/** The caution that a line carries: of the hazards that it touches the one with the gravest signal word. */
function worstHazard(block: TableBlock, line: Line, cautions: readonly HazardBlock[]): SearchHazard | null {
  let worst: SearchHazard | null = null;
  for (const kind of hazardsTouchedByLine(block, line)) {
    const own = nearest(
      cautions.filter((caution) => hazardsOf(caution).includes(kind)),
      line.line,
    );
    const hazard: SearchHazard =
      own === null
        ? { signal: bookCautions[kind].signal, kind, text: null }
        : { signal: own.signal, kind, text: own.text };
    if (worst === null || signalWords.indexOf(hazard.signal) < signalWords.indexOf(worst.signal)) worst = hazard;
  }
  return worst;
}

/** The last caution that stands before a line of the page, else the first one after it. */
function nearest(cautions: readonly HazardBlock[], line: number): HazardBlock | null {
  return cautions.findLast((caution) => caution.line <= line) ?? cautions[0] ?? null;
}

function placeOf(hazards: SearchHazard[], wanted: SearchHazard | null): number | null {
  if (wanted === null) return null;
  const place = hazards.findIndex(
    ({ signal, kind, text }) => signal === wanted.signal && kind === wanted.kind && text === wanted.text,
  );
  return place >= 0 ? place : hazards.push(wanted) - 1;
}

function faceOf({ layout, seen, first, latch, contacts }: ConnectorBlock): SearchFace {
  return { layout: formatLayout(layout), seen, first, latch, contacts };
}

/** A layout as the dialect writes it; `readLayout` reads it back. */
function formatLayout(layout: FaceLayout): string {
  if (layout.kind === 'ring') return `round ${layout.cavities}`;
  return layout.rows
    .map((row) => (row.every(Boolean) ? String(row.length) : row.map((isCavity) => (isCavity ? 'x' : '.')).join('')))
    .join('+');
}
