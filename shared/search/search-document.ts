import type { Corner, FaceSide, HazardKind, LatchSide, SignalWord, TerminalName } from '../blocks/block.ts';
import type { Applicability } from '../pages/applicability.ts';
import type { PageAddress } from '../pages/address.ts';
import type { PageKind } from '../pages/page-kind.ts';
import type { WireColour } from '../wire-colours/colour-system.ts';

/** What holds lines, as the search tells it apart. */
export const holderKinds = ['connector', 'components', 'switch', 'wires', 'inside', 'checks'] as const;

/** The kind of a block that holds lines. */
export type HolderKind = (typeof holderKinds)[number];

/** What is special about a line: an empty cavity, a live lead that ends insulated, a wire that a modification takes away. */
export const lineStates = ['plain', 'blank', 'capped', 'removed'] as const;

/** What is special about a line. */
export type LineState = (typeof lineStates)[number];

/** A wire's colour as written, and everything that it may mean: more than one where its letters are ambiguous. */
export interface IndexedColour {
  readonly code: string;
  readonly readings: readonly WireColour[];
}

/** A line as the search knows it. */
export interface SearchLine {
  /** Without the page and without `#`: `headlight.2~1980-`. */
  readonly address: string;
  /** What it is called inside its block: a cavity with its `+`, a component's id, a switch's position, `49--49a`; else empty. */
  readonly own: string;
  /** What it is for, in words: a circuit, a component's name, a check. */
  readonly text: string;
  /** What else is read of it: `fuse, 15 A`, the contacts that a position joins, what a check expects. */
  readonly detail: string;
  readonly colour: IndexedColour | null;
  /** The wire's size as written. */
  readonly size: string | null;
  /** Where it leads; both ends, for a row of a wires block. */
  readonly goesTo: readonly TerminalName[];
  readonly applies: Applicability;
  /** True where a factory manual or a standard is its source. */
  readonly cited: boolean;
  readonly state: LineState;
  /** The caution that it carries: its place in the document's hazards; null where it touches none. */
  readonly hazard: number | null;
}

/** What a connector's face is drawn from, besides its lines. */
export interface SearchFace {
  /** As the dialect writes it: `3+4`, `xx.xx+xxxxx`, `round 6`. */
  readonly layout: string;
  readonly seen: FaceSide;
  readonly first: Corner | null;
  readonly latch: LatchSide | null;
  readonly contacts: 'pins' | 'sockets' | null;
}

/** A block that holds lines. */
export interface SearchHolder {
  readonly kind: HolderKind;
  readonly id: string;
  readonly name: string;
  readonly zone: string;
  readonly face: SearchFace | null;
  readonly lines: readonly SearchLine[];
}

/** A caution as it travels with a line. */
export interface SearchHazard {
  readonly signal: SignalWord;
  readonly kind: HazardKind;
  /** The page's own words; null where the page has none of that hazard and the book's own stand in. */
  readonly text: string | null;
}

/** A heading with its prose; the first may have no heading and no anchor. */
export interface SearchSection {
  readonly id: string;
  readonly heading: string;
  readonly text: string;
}

/** Everything of a published page that the search knows. Plain data that survives JSON and a thread's border. */
export interface SearchDocument {
  readonly address: PageAddress;
  readonly subjectTitle: string;
  readonly title: string;
  readonly kind: PageKind;
  readonly summary: string;
  readonly hazards: readonly SearchHazard[];
  readonly holders: readonly SearchHolder[];
  readonly sections: readonly SearchSection[];
}
