import type { Applicability } from '../pages/applicability.ts';
import type { ColourReading, ColourSystem } from '../wire-colours/colour-system.ts';
import type { FaceLayout } from './face-layout.ts';
import type { Rating } from './rating.ts';
import type { WireSize } from '../electrics/wire-sizes.ts';
import type { Expectation } from './expectation.ts';
import type { Condition } from './condition.ts';
import type { SourceTableRow } from './source-table.ts';

/** A terminal by name: a component's or connector's id and the terminal; null where the id alone is written. */
export interface TerminalName {
  readonly id: string;
  readonly terminal: string | null;
}

/** A column of a block's table: its heading as written and what the program reads it as; null is shown and not read. */
export interface Column<Role extends string> {
  readonly heading: string;
  readonly role: Role | null;
}

/** What every line has: an address, a place in the text, what it holds for, and its cells as written, column by column. */
export interface Line {
  /** Without the page and without `#`: `headlight.2~1980-`. */
  readonly address: string;
  /** Line of the page's text, counted from 1 with the front matter. */
  readonly line: number;
  readonly applies: Applicability;
  readonly cells: readonly string[];
  /** What the row has beyond the last heading, where it has too many cells: shown, and not read. */
  readonly strayCells?: readonly string[];
  readonly note: string | null;
  /** The id of the source: the row's own, else its block's. */
  readonly cite: string | null;
}

interface BlockBase {
  readonly id: string | null;
  readonly name: string | null;
  readonly cite: string | null;
  /** First and last line of the directive, counted from 1 with the front matter. */
  readonly line: number;
  readonly endLine: number;
  /** Attributes that the program does not read; kept for the writer. */
  readonly otherAttributes: Readonly<Record<string, string>>;
  /** Rows of the table that could not be read as lines (findings say why) and are still shown; absent without any. */
  readonly unreadRows?: readonly SourceTableRow[];
}

/** One wire's colour as it stands in a cell: what was written and what it reads as. */
export interface WrittenColour {
  readonly written: string;
  readonly reading: ColourReading;
}

export type ConnectorColumn =
  'cavity' | 'wire' | 'size' | 'circuit' | 'goes-to' | 'years' | 'markets' | 'frames' | 'note' | 'cite';

/** A row of a connector: a wire in a cavity, or an empty cavity. */
export interface ConnectorLine extends Line {
  /** The cavity's name without any `+` that counts further wires: `2` of `2++`. */
  readonly cavity: string;
  /** 0 for the first wire in the cavity, 1 for `2+`, 2 for `2++`. */
  readonly further: number;
  readonly blank: boolean;
  readonly capped: boolean;
  readonly wire: WrittenColour | null;
  readonly size: WireSize | null;
  readonly circuit: string | null;
  readonly goesTo: readonly TerminalName[];
}

export type FaceSide = 'wire side' | 'mating side';
export type Corner = 'top left' | 'top right' | 'bottom left' | 'bottom right';
export type LatchSide = 'top' | 'bottom' | 'left' | 'right';

export interface ConnectorBlock extends BlockBase {
  readonly kind: 'connector';
  readonly id: string;
  readonly zone: string | null;
  readonly layout: FaceLayout;
  readonly seen: FaceSide;
  readonly first: Corner | null;
  readonly latch: LatchSide | null;
  readonly contacts: 'pins' | 'sockets' | null;
  readonly housing: string | null;
  readonly terminals: string | null;
  readonly mates: string | null;
  readonly colours: ColourSystem;
  readonly columns: readonly Column<ConnectorColumn>[];
  readonly lines: readonly ConnectorLine[];
}

export const componentKinds = [
  'battery',
  'earth',
  'splice',
  'fuse',
  'breaker',
  'load',
  'starter',
  'motor',
  'ignition-coil',
  'relay',
  'flasher',
  'diode',
  'resistor',
  'ammeter',
  'condenser',
  'sender',
  'alternator',
  'dynamo',
  'regulator',
  'igniter',
  'sensor',
  'module',
  'control-unit',
] as const;
export type ComponentKind = (typeof componentKinds)[number];

export type ComponentColumn =
  'id' | 'kind' | 'name' | 'rating' | 'earthed-by' | 'zone' | 'years' | 'markets' | 'frames' | 'note' | 'cite';

export interface ComponentLine extends Line {
  readonly id: string;
  readonly componentKind: ComponentKind;
  readonly name: string | null;
  readonly rating: Rating | null;
  /** What earths it by its mounting: which of its terminals (null: the kind's usual one) and the earth's id. */
  readonly earthedBy: { readonly terminal: string | null; readonly earth: string } | null;
  readonly zone: string | null;
}

export interface ComponentsBlock extends BlockBase {
  readonly kind: 'components';
  readonly columns: readonly Column<ComponentColumn>[];
  readonly lines: readonly ComponentLine[];
}

export const switchRoles = [
  'ignition',
  'kill',
  'start',
  'neutral',
  'clutch',
  'sidestand',
  'brake',
  'lights',
  'dip',
  'indicators',
  'horn',
  'other',
] as const;
export type SwitchRole = (typeof switchRoles)[number];

/** A position of a switch and the contacts that it joins, group by group. */
export interface SwitchLine extends Line {
  readonly position: string;
  /** Each group is the contacts that are joined to one another in this position. */
  readonly joined: readonly (readonly string[])[];
}

export type SwitchColumn = 'position' | 'contact' | 'years' | 'markets' | 'frames' | 'note' | 'cite';

export interface SwitchBlock extends BlockBase {
  readonly kind: 'switch';
  readonly id: string;
  readonly zone: string | null;
  readonly role: SwitchRole;
  readonly rest: string | null;
  readonly sprung: readonly string[];
  readonly movesWith: string | null;
  readonly contacts: readonly string[];
  readonly columns: readonly Column<SwitchColumn>[];
  readonly lines: readonly SwitchLine[];
}

export type WireColumn =
  'from' | 'to' | 'wire' | 'size' | 'length' | 'circuit' | 'years' | 'markets' | 'frames' | 'note' | 'cite';

export interface WireLine extends Line {
  readonly from: TerminalName;
  readonly to: TerminalName;
  /** True where `Wire` says `removed`: a safe modification takes the donor's wire away. */
  readonly removed: boolean;
  readonly wire: WrittenColour | null;
  readonly size: WireSize | null;
  readonly lengthMetres: number | null;
  readonly circuit: string | null;
}

export interface WiresBlock extends BlockBase {
  readonly kind: 'wires';
  readonly colours: ColourSystem;
  readonly columns: readonly Column<WireColumn>[];
  readonly lines: readonly WireLine[];
}

/** What is known of the inside of a unit between two of its terminals, or at one. */
export type InsideJoin =
  | { readonly kind: 'joins' }
  | { readonly kind: 'diode' }
  | { readonly kind: 'resistor'; readonly ohms: number }
  | { readonly kind: 'output'; readonly amps: number }
  | { readonly kind: 'input to earth' }
  | { readonly kind: 'input to live' };

export type InsideColumn = 'from' | 'to' | 'as' | 'when' | 'years' | 'markets' | 'frames' | 'note' | 'cite';

export interface InsideLine extends Line {
  readonly from: string;
  readonly to: string | null;
  readonly as: InsideJoin;
  readonly when: Condition | null;
}

export interface InsideBlock extends BlockBase {
  readonly kind: 'inside';
  readonly id: string;
  readonly columns: readonly Column<InsideColumn>[];
  readonly lines: readonly InsideLine[];
}

export type CheckColumn =
  'check' | 'between' | 'expect' | 'at' | 'how' | 'years' | 'markets' | 'frames' | 'note' | 'cite';

export interface CheckLine extends Line {
  readonly check: string;
  /** As written: two terminals, or a place in words. */
  readonly between: string;
  /** The terminals that `Between` names, where it names terminals. */
  readonly terminals: readonly TerminalName[];
  /** Null where it cannot be read (a finding says so). */
  readonly expect: Expectation | null;
  readonly expectWritten: string;
  readonly at: string | null;
  readonly how: string | null;
}

export interface ChecksBlock extends BlockBase {
  readonly kind: 'checks';
  readonly columns: readonly Column<CheckColumn>[];
  readonly lines: readonly CheckLine[];
}

export const signalWords = ['danger', 'warning', 'caution', 'notice'] as const;
export type SignalWord = (typeof signalWords)[number];
export const hazardKinds = ['battery', 'starter', 'ignition', 'charging', 'fuel', 'brakes'] as const;
export type HazardKind = (typeof hazardKinds)[number];

/** A caution: no lines, but it belongs to the step that it stands before. */
export interface HazardBlock extends BlockBase {
  readonly kind: 'hazard';
  readonly signal: SignalWord;
  readonly of: readonly HazardKind[];
  /** The caution's words as plain text, for hits and paths that carry it. */
  readonly text: string;
}

/** A sum by name with its figures as written. */
export interface CalculatorBlock extends BlockBase {
  readonly kind: 'calculator';
  readonly sum: string;
  readonly figures: Readonly<Record<string, string>>;
}

/** A block that has lines. */
export type TableBlock = ConnectorBlock | ComponentsBlock | SwitchBlock | WiresBlock | InsideBlock | ChecksBlock;

/** Any directive of the dialect that could be read. */
export type Block = TableBlock | HazardBlock | CalculatorBlock;
