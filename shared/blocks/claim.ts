import { compareCodePoints } from '../lib/code-point-order.ts';
import type { Applicability } from '../pages/applicability.ts';
import { formatYears } from '../pages/years.ts';
import type { WireSize } from '../electrics/wire-sizes.ts';
import type {
  CheckLine,
  ComponentLine,
  ConnectorLine,
  InsideLine,
  SwitchLine,
  TableBlock,
  TerminalName,
  WireLine,
  WrittenColour,
} from './block.ts';
import type { TableLine } from './lines.ts';
import type { Rating } from './rating.ts';
import { formatTerminalName } from './terminal-name.ts';

type Claim = readonly unknown[];

/**
 * What a line claims, as canonical text: its terminals, its electrical cells and what it holds for; not its note, its
 * source, its name or its place. Two ways of writing one thing (`YR`, `Y/R`; `0.85`, `0,85 mm²`) claim the same.
 */
export function claimOf(block: TableBlock, line: TableLine): string {
  return JSON.stringify([block.kind, ...claimIn(block.id ?? '', line), claimedApplicability(line.applies)]);
}

function claimIn(blockId: string, line: TableLine): Claim {
  if ('cavity' in line) return connectorClaim(blockId, line);
  if ('componentKind' in line) return componentClaim(line);
  if ('position' in line) return switchClaim(blockId, line);
  if ('removed' in line) return wireClaim(line);
  if ('check' in line) return checkClaim(line);
  return insideClaim(blockId, line);
}

function connectorClaim(id: string, line: ConnectorLine): Claim {
  const { cavity, further, blank, capped, wire, size, circuit, goesTo } = line;
  const ends = goesTo.map(formatTerminalName).toSorted(compareCodePoints);
  return [id, cavity, further, blank, capped, colour(wire), area(size), words(circuit), ends];
}

function componentClaim({ id, componentKind, rating, earthedBy }: ComponentLine): Claim {
  return [id, componentKind, figures(rating), earthedBy === null ? null : [earthedBy.terminal, earthedBy.earth]];
}

function switchClaim(id: string, { position, joined }: SwitchLine): Claim {
  const groups = joined.map((group) => group.toSorted(compareCodePoints));
  return [id, words(position), groups.toSorted((a, b) => compareCodePoints(a.join(), b.join()))];
}

function wireClaim({ from, to, removed, wire, size, lengthMetres, circuit }: WireLine): Claim {
  return [ends(from, to), removed, colour(wire), area(size), lengthMetres, words(circuit)];
}

function ends(...names: readonly TerminalName[]): readonly string[] {
  return names.map(formatTerminalName).toSorted(compareCodePoints);
}

function insideClaim(id: string, { from, to, as, when }: InsideLine): Claim {
  const condition = when === null ? null : when.kind === 'words' ? words(when.words) : [when.terminal, when.at];
  return [id, from, to, Object.values(as), condition];
}

function checkClaim({ between, terminals, expect, expectWritten, at, how }: CheckLine): Claim {
  const place = terminals.length === 0 ? words(between) : ends(...terminals);
  return [place, expect === null ? words(expectWritten) : Object.values(expect), words(at), words(how)];
}

function colour(wire: WrittenColour | null): Claim | null {
  if (wire === null) return null;
  return wire.reading.kind === 'read' ? [wire.reading.colour.base, wire.reading.colour.tracer] : [words(wire.written)];
}

function area(size: WireSize | null): number | null {
  return size === null ? null : Number(size.squareMillimetres.toPrecision(4));
}

/** A rating by its figures; by its words where it has none that were read. */
function figures(rating: Rating | null): Claim | null {
  if (rating === null) return null;
  const { volts, amps, blow, watts, ohms, ampHours, feeds } = rating;
  const read = [volts, amps, watts, ohms, ampHours].some((figure) => figure !== null) || feeds.length > 0;
  if (!read) return [words(rating.written)];
  return [
    volts,
    amps,
    blow,
    watts,
    ohms,
    ampHours,
    feeds.map(({ name, watts: power, amps: current }) => [name, power, current]),
  ];
}

function words(text: string | null): string | null {
  return text === null ? null : text.trim().replace(/\s+/g, ' ').toLowerCase();
}

function claimedApplicability({ years, markets, frames }: Applicability): Claim {
  const sorted = (names: readonly string[]): readonly string[] =>
    names.map((name) => name.toLowerCase()).toSorted(compareCodePoints);
  return [formatYears(years), sorted(markets), sorted(frames)];
}
