import type { ConnectorBlock, ConnectorLine } from '../blocks/block.ts';
import { readLayout } from '../blocks/read-layout.ts';
import { appliesToAll } from '../pages/applicability.ts';
import type { ColourReading } from '../wire-colours/colour-system.ts';
import { textAt, type IndexedHolder, type LinesIndex } from './lines-index.ts';
import { lineStates, type IndexedColour } from './search-document.ts';

/**
 * A connector as far as its face needs it, made again from the index, so that it is drawn by the same hand as on its
 * page. Null for a block that is no connector or whose layout cannot be read.
 */
export function indexedConnector(index: LinesIndex, holder: IndexedHolder): ConnectorBlock | null {
  const layout = holder.face === null ? null : readLayout(holder.face.layout);
  if (holder.face === null || layout === null) return null;
  const { seen, first, latch, contacts } = holder.face;
  return {
    kind: 'connector',
    id: holder.id,
    name: holder.name === '' ? null : holder.name,
    cite: null,
    line: 0,
    endLine: 0,
    otherAttributes: {},
    zone: holder.zone === '' ? null : holder.zone,
    layout,
    seen,
    first,
    latch,
    contacts,
    housing: null,
    terminals: null,
    mates: null,
    colours: { name: 'jis' },
    columns: [],
    lines: indexedLines(index, holder),
  };
}

function indexedLines(index: LinesIndex, { start, end }: IndexedHolder): ConnectorLine[] {
  const cavities = new Set<string>();
  return Array.from({ length: end - start }, (_, at) => {
    const read = indexedLine(index, start + at, cavities);
    cavities.add(read.cavity);
    return read;
  });
}

/** A cavity's name without the pluses that count its further wires: `B+` with no `B` above it is a cavity of that name. */
function cavityOf(own: string, above: ReadonlySet<string>): { cavity: string; further: number } {
  const cavity = own.replace(/\++$/, '');
  return above.has(cavity) ? { cavity, further: own.length - cavity.length } : { cavity: own, further: 0 };
}

function indexedLine(index: LinesIndex, line: number, above: ReadonlySet<string>): ConnectorLine {
  const own = index.names[index.own[line] ?? 0] ?? '';
  const state = lineStates[index.states[line] ?? 0];
  const colour = index.colours[index.colour[line] ?? 0] ?? null;
  const circuit = textAt(index.texts, line);
  return {
    address: own,
    line,
    applies: index.applicabilities[index.applies[line] ?? 0] ?? appliesToAll,
    cells: [],
    note: null,
    cite: null,
    ...cavityOf(own, above),
    blank: state === 'blank',
    capped: state === 'capped',
    wire: colour === null ? null : { written: colour.code, reading: readingOf(colour) },
    size: null,
    circuit: circuit === '' ? null : circuit,
    goesTo: [],
  };
}

function readingOf({ readings }: IndexedColour): ColourReading {
  const [colour, ...others] = readings;
  if (colour === undefined) return { kind: 'unknown' };
  return others.length === 0 ? { kind: 'read', colour } : { kind: 'ambiguous', colour, others };
}
