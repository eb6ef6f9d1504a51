import type { ConnectorBlock, ConnectorLine, FaceSide, LatchSide } from '../blocks/block.ts';
import type { FaceLayout } from '../blocks/face-layout.ts';
import { seatsOf, type SeatPlace } from '../blocks/seats.ts';
import type { Variant } from '../pages/applicability.ts';
import { applicabilityWords } from '../pages/applicability-words.ts';
import { appliesTo } from '../pages/variant.ts';
import type { WireColour } from '../wire-colours/colour-system.ts';
import { wireColourWords } from '../wire-colours/colour-words.ts';

/** A wire as it is seen in its cavity. */
export interface FaceWire {
  /** What its letters read as: one colour, several where they are ambiguous, none where nothing can be read. */
  readonly colours: readonly WireColour[];
  /** The letters as written; empty where there are none. */
  readonly code: string;
}

/** What a seat of the face holds. `unwritten`: no row says; `set back`: its rows are of another year or market. */
export type SeatState = 'wired' | 'blank' | 'capped' | 'unwritten' | 'set back';

/** A place of the face with what is in it. */
export interface FaceSeat {
  /** From 1, counted from the first cavity. */
  readonly number: number;
  readonly place: SeatPlace;
  readonly cavity: string | null;
  readonly state: SeatState;
  readonly wires: readonly FaceWire[];
  /** True where the wires are those of different years or markets, one at a time; false where they share the cavity. */
  readonly either: boolean;
  /** True where more wires are in the cavity than `wires` has. */
  readonly more: boolean;
  /** What a screen reader says of it: `cavity 3, yellow, red tracer, main beam`. */
  readonly words: string;
}

/** A connector's face as plain values: enough to draw either side of it. */
export interface Face {
  readonly layout: FaceLayout;
  readonly seen: FaceSide;
  /** False where nothing says where the first cavity is: the numbering is not confirmed. */
  readonly oriented: boolean;
  readonly latch: LatchSide | null;
  readonly contacts: 'pins' | 'sockets' | null;
  readonly seats: readonly FaceSeat[];
}

/** How many wires a seat has room for, with letters that can still be read. */
const mostWires = 2;

/**
 * The face of a connector for one bike: wires of other years and markets are left out where a variant is chosen.
 * @param connector the block
 * @param variant what the reader has on the bench
 */
export function faceOf(connector: ConnectorBlock, variant: Variant): Face {
  const byCavity = new Map<string, ConnectorLine[]>();
  for (const line of connector.lines) {
    const lines = byCavity.get(line.cavity);
    if (lines === undefined) byCavity.set(line.cavity, [line]);
    else lines.push(line);
  }
  return {
    layout: connector.layout,
    seen: connector.seen,
    oriented: connector.first !== null,
    latch: connector.latch,
    contacts: connector.contacts,
    seats: seatsOf(connector).map((seat) => {
      const lines = seat.cavity === null ? [] : (byCavity.get(seat.cavity) ?? []);
      const here = lines.filter(({ applies }) => appliesTo(applies, variant).applies);
      const state = stateOf(lines, here);
      const words = wordsOf(seat.cavity ?? String(seat.number), state, here);
      return { ...seat, state, ...wiresOf(here), words };
    }),
  };
}

function stateOf(lines: readonly ConnectorLine[], here: readonly ConnectorLine[]): SeatState {
  if (lines.length === 0) return 'unwritten';
  if (here.length === 0) return 'set back';
  if (here.every(({ blank }) => blank)) return 'blank';
  return here.every(({ blank, capped }) => blank || capped) ? 'capped' : 'wired';
}

/** Rows of one rank (`2` and `2`, or `2+` and `2+`) are of different bikes; `2` and `2+` share the cavity. */
function wiresOf(lines: readonly ConnectorLine[]): Pick<FaceSeat, 'wires' | 'either' | 'more'> {
  const filled = lines.filter(({ blank }) => !blank);
  const ranks = new Set(filled.map(({ further }) => further));
  const either = ranks.size < filled.length;
  const lowest = Math.min(...ranks);
  const shown = distinctWires(either ? filled.filter(({ further }) => further === lowest) : filled, either);
  return {
    wires: shown.slice(0, mostWires),
    either: either && shown.length > 1,
    more: shown.length > mostWires || (either && ranks.size > 1),
  };
}

function distinctWires(lines: readonly ConnectorLine[], either: boolean): readonly FaceWire[] {
  const wires = lines.map(wireOf);
  // Two black wires in one cavity are two wires; a wire that is black in either year is one.
  return either ? wires.filter(({ code }, at) => wires.findIndex((wire) => wire.code === code) === at) : wires;
}

function wireOf({ wire }: ConnectorLine): FaceWire {
  if (wire === null) return { colours: [], code: '' };
  return { colours: coloursOf(wire), code: wire.written };
}

function coloursOf({ reading }: NonNullable<ConnectorLine['wire']>): readonly WireColour[] {
  if (reading.kind === 'unknown') return [];
  return reading.kind === 'ambiguous' ? [reading.colour, ...reading.others] : [reading.colour];
}

function wordsOf(cavity: string, state: SeatState, lines: readonly ConnectorLine[]): string {
  const contents: Readonly<Record<SeatState, string>> = {
    wired: '',
    blank: 'empty',
    capped: '',
    unwritten: 'not written down',
    'set back': 'nothing on the bike that you chose',
  };
  const wires = state === 'blank' ? [] : lines.map((line) => wireWords(line, lines.length > 1));
  return [`cavity ${cavity}`, contents[state], wires.join('; ')].filter((part) => part !== '').join(', ');
}

function wireWords(line: ConnectorLine, withYears: boolean): string {
  const { blank, wire, circuit, capped, applies, further } = line;
  const colours = wire === null ? [] : coloursOf(wire).map(wireColourWords);
  const colour = wire === null ? null : colours.length === 0 ? wire.written : colours.join(' or ');
  return [
    further > 0 ? 'also' : null,
    blank ? 'empty' : colour,
    blank ? null : circuit?.toLowerCase(),
    capped ? 'capped' : null,
    withYears ? applicabilityWords(applies) : null,
  ]
    .filter((word) => word !== null && word !== undefined && word !== '')
    .join(', ');
}
