import type { ConnectorBlock, ConnectorLine, FaceSide, LatchSide } from '../blocks/block.ts';
import type { FaceLayout } from '../blocks/face-layout.ts';
import { seatsOf, type SeatPlace } from '../blocks/seats.ts';
import type { Variant } from '../pages/applicability.ts';
import { appliesTo } from '../pages/variant.ts';
import type { WireColour } from '../wire-colours/colour-system.ts';
import { wireColourWords } from '../wire-colours/colour-words.ts';

/** A wire as it is seen in its cavity. */
export interface FaceWire {
  /** Null where the colour could not be read, or nothing says it. */
  readonly colour: WireColour | null;
  /** The letters as written; empty where there are none. */
  readonly code: string;
  /** True where it shares the cavity with another on the same bike; false where it is another year's or market's wire. */
  readonly further: boolean;
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

/**
 * The face of a connector for one bike: wires of other years and markets are left out where a variant is chosen.
 * @param connector the block
 * @param variant what the reader has on the bench
 */
export function faceOf(connector: ConnectorBlock, variant: Variant): Face {
  return {
    layout: connector.layout,
    seen: connector.seen,
    oriented: connector.first !== null && connector.latch !== null,
    latch: connector.latch,
    contacts: connector.contacts,
    seats: seatsOf(connector).map((seat) => {
      const lines = connector.lines.filter(({ cavity }) => cavity === seat.cavity);
      const here = lines.filter(({ applies }) => appliesTo(applies, variant).applies);
      const state = stateOf(lines, here);
      return { ...seat, state, wires: wiresOf(here), words: wordsOf(seat.cavity ?? String(seat.number), state, here) };
    }),
  };
}

function stateOf(lines: readonly ConnectorLine[], here: readonly ConnectorLine[]): SeatState {
  if (lines.length === 0) return 'unwritten';
  if (here.length === 0) return 'set back';
  if (here.every(({ blank }) => blank)) return 'blank';
  return here.every(({ blank, capped }) => blank || capped) ? 'capped' : 'wired';
}

function wiresOf(lines: readonly ConnectorLine[]): readonly FaceWire[] {
  return lines
    .filter(({ blank }) => !blank)
    .map(({ wire, further }) => ({
      colour: wire === null || wire.reading.kind === 'unknown' ? null : wire.reading.colour,
      code: wire?.written ?? '',
      further: further > 0,
    }));
}

function wordsOf(cavity: string, state: SeatState, lines: readonly ConnectorLine[]): string {
  const contents: Readonly<Record<SeatState, string>> = {
    wired: '',
    blank: 'empty',
    capped: '',
    unwritten: 'not written down',
    'set back': 'nothing on the bike that you chose',
  };
  const wires = lines.flatMap(({ blank, wire, circuit, capped }) => {
    if (blank) return [];
    const colour =
      wire === null ? null : wire.reading.kind === 'unknown' ? wire.written : wireColourWords(wire.reading.colour);
    return [[colour, circuit, capped ? 'capped' : null].filter((word) => word !== null).join(', ')];
  });
  return [`cavity ${cavity}`, contents[state], wires.join('; or ')].filter((part) => part !== '').join(', ');
}
