import { bookCautions } from '../blocks/book-cautions.ts';
import { formatTerminalName } from '../blocks/terminal-name.ts';
import { drawFace } from '../drawing/draw-face.ts';
import { drawWire } from '../drawing/draw-wire.ts';
import { drawingMarkup } from '../drawing/drawing.ts';
import { faceOf } from '../drawing/face.ts';
import type { TerminalName } from '../blocks/block.ts';
import { formatPageAddress, linePath } from '../pages/address.ts';
import { applicabilityWords } from '../pages/applicability-words.ts';
import { appliesToAll, type Variant } from '../pages/applicability.ts';
import { wireColourWords } from '../wire-colours/colour-words.ts';
import type { LineFound } from './best-lines.ts';
import { indexedConnector } from './indexed-connector.ts';
import { usualAddress } from './lines-file.ts';
import { textAt, type IndexedHolder, type IndexedPage, type LinesIndex } from './lines-index.ts';
import type { ProseIndex } from './prose-index.ts';
import { lineStates, type IndexedColour } from './search-document.ts';
import type { SearchHit, SearchHitLine } from './search-hit.ts';

/** The address of a line in its page: `headlight.2~1980-`. */
export function lineAddress(index: LinesIndex, holder: IndexedHolder, line: number): string {
  return (
    index.addresses.get(line) ??
    usualAddress(holder.kind, holder.id, {
      own: index.names[index.own[line] ?? 0] ?? '',
      text: textAt(index.texts, line),
      goesTo: endsOf(index, line),
      applies: index.applicabilities[index.applies[line] ?? 0] ?? appliesToAll,
    })
  );
}

/** Where a line leads, or both ends of a wire. */
export function endsOf({ endStart, endIds, endTerminals }: LinesIndex, line: number): TerminalName[] {
  const ends: TerminalName[] = [];
  for (let end = endStart[line] ?? 0; end < (endStart[line + 1] ?? 0); end += 1) {
    const terminal = textAt(endTerminals, end);
    ends.push({ id: textAt(endIds, end), terminal: terminal === '' ? null : terminal });
  }
  return ends;
}

/**
 * Makes a hit of a line: everything that it says, with its wire and its connector's face drawn.
 * @param prose where the page's own words of a caution are; the book's own stand in until they are there
 * @param variant the one bike that is meant
 */
export function lineHit(
  index: LinesIndex,
  prose: ProseIndex | null,
  found: LineFound,
  variant: Variant,
): SearchHit | null {
  const holder = index.holders[found.holder];
  const page = holder === undefined ? undefined : index.pages[holder.page];
  if (holder === undefined || page === undefined) return null;
  const address = lineAddress(index, holder, found.line);
  const line = lineOf(index, holder, page, prose, found, variant);
  return {
    kind: 'line',
    address: `${formatPageAddress(page.address)}#${address}`,
    path: linePath(page.address, address),
    title: line.circuit === null ? line.where : `${line.where}: ${line.circuit}`,
    subjectTitle: index.subjects[page.subject]?.title ?? '',
    excerpt: page.title,
    mark: index.cited[found.line] === 1 ? 'cited' : 'unchecked',
    line,
  };
}

function lineOf(
  index: LinesIndex,
  holder: IndexedHolder,
  page: IndexedPage,
  prose: ProseIndex | null,
  { line, applies }: LineFound,
  variant: Variant,
): SearchHitLine {
  const colour = index.colours[index.colour[line] ?? 0] ?? null;
  const size = textAt(index.sizes, line);
  const applicability = index.applicabilities[index.applies[line] ?? 0] ?? appliesToAll;
  return {
    where: whereOf(index, holder, line),
    colour: colour?.code ?? null,
    colourWords: colour === null ? null : colourWordsOf(colour),
    size: size === '' ? null : /[a-z²]/i.test(size) ? size : `${size} mm²`,
    circuit: circuitOf(index, holder, line),
    goesTo: goesToOf(index, holder, line),
    applies: applies.applies ? applicabilityWords(applicability) : applies.why,
    appliesHere: applies.applies,
    hazard: hazardOf(index, page, prose, line),
    // Letters that read as two colours are drawn as both.
    wireSvg:
      colour === null || colour.readings.length === 0
        ? null
        : colour.readings.map(drawWire).map(drawingMarkup).join(''),
    faceSvg: faceMarkup(index, holder, line, variant),
  };
}

/** A colour in words; one whose letters may mean several says all of them. */
function colourWordsOf({ code, readings }: IndexedColour): string {
  return readings.length === 0 ? `${code}, not a colour of its system` : readings.map(wireColourWords).join(' or ');
}

function nameOf({ name, id }: IndexedHolder): string {
  return name === '' ? id : name;
}

/** Where the line is on the bike: its connector and cavity, or what it is itself. */
function whereOf(index: LinesIndex, holder: IndexedHolder, line: number): string {
  const own = index.names[index.own[line] ?? 0] ?? '';
  const ends = endsOf(index, line).map(formatTerminalName);
  switch (holder.kind) {
    case 'connector':
      return `${nameOf(holder)}, cavity ${own}`;
    case 'components':
      return textAt(index.texts, line);
    case 'switch':
      return `${nameOf(holder)}, position ${own}`;
    case 'wires':
      return `Wire from ${ends[0] ?? '?'} to ${ends[1] ?? '?'}`;
    case 'inside':
      return `Inside ${nameOf(holder)}, ${own.replace('--', ' to ')}`;
    case 'checks':
      return `Check: ${textAt(index.texts, line)}`;
  }
}

/** What the line is for, or what else it says of itself. */
function circuitOf(index: LinesIndex, holder: IndexedHolder, line: number): string | null {
  const text = holder.kind === 'connector' || holder.kind === 'wires' ? textAt(index.texts, line) : '';
  const state = lineStates[index.states[line] ?? 0];
  const special =
    state === 'blank'
      ? 'empty cavity'
      : state === 'capped'
        ? 'live, ends insulated'
        : state === 'removed'
          ? 'taken away'
          : '';
  const parts = [text, textAt(index.details, line), special].filter((part) => part !== '');
  return parts.length === 0 ? null : parts.join(', ');
}

function goesToOf(index: LinesIndex, holder: IndexedHolder, line: number): string | null {
  const ends = endsOf(index, line).map(formatTerminalName);
  if (holder.kind === 'checks' || ends.length === 0) return null;
  if (holder.kind === 'components') return `earthed by ${ends.join(', ')}`;
  return holder.kind === 'wires' ? (ends[1] ?? null) : ends.join(', ');
}

function hazardOf(
  index: LinesIndex,
  page: IndexedPage,
  prose: ProseIndex | null,
  line: number,
): SearchHitLine['hazard'] {
  const place = (index.hazard[line] ?? 0) - 1;
  const hazard = page.hazards[place];
  if (hazard === undefined) return null;
  const own = prose?.page(formatPageAddress(page.address))?.cautions[place];
  return { signal: hazard.signal, text: own ?? bookCautions[hazard.kind].text };
}

/** Faces drawn lately, by index: as a query is typed the same lines keep coming back. */
const drawnFaces = new WeakMap<LinesIndex, Map<string, string | null>>();
const mostDrawn = 400;

/** The connector's face from the side that its page shows, with the line's cavity ringed. */
function faceMarkup(index: LinesIndex, holder: IndexedHolder, line: number, variant: Variant): string | null {
  if (holder.face === null) return null;
  const drawn = drawnFaces.get(index) ?? new Map<string, string | null>();
  drawnFaces.set(index, drawn);
  const key = [line, variant.year, variant.market, variant.frame].join(' ');
  let markup = drawn.get(key);
  if (markup === undefined) {
    markup = drawMarkup(index, holder, line, variant);
    if (drawn.size >= mostDrawn) drawn.clear();
    drawn.set(key, markup);
  }
  return markup;
}

function drawMarkup(index: LinesIndex, holder: IndexedHolder, line: number, variant: Variant): string | null {
  const connector = indexedConnector(index, holder);
  if (connector === null) return null;
  const cavity = connector.lines[line - holder.start]?.cavity ?? null;
  const face = faceOf(connector, variant);
  return drawingMarkup(drawFace(face, { side: face.seen, ringed: cavity, title: nameOf(holder) }));
}
