import type { ConnectorBlock, Corner } from './block.ts';
import type { FaceLayout } from './face-layout.ts';

/** Where a seat is on the face, from the connector's own `seen` side. */
export type SeatPlace =
  /** Row and column from 0 in the layout, gaps counted. */
  | { readonly kind: 'rows'; readonly row: number; readonly column: number }
  /** Degrees clockwise from the top of the ring. */
  | { readonly kind: 'ring'; readonly degrees: number };

/** A place for a cavity on a face. */
export interface Seat {
  /** From 1, counted from the first cavity. */
  readonly number: number;
  /** Null where no row of the table names it. */
  readonly cavity: string | null;
  readonly place: SeatPlace;
}

/** The degrees, clockwise from the top, at which a ring's first cavity stands. */
const ringStarts: Readonly<Record<Corner, number>> = {
  'top left': 315,
  'top right': 45,
  'bottom right': 135,
  'bottom left': 225,
};

/**
 * The seats of a connector's face from its own `seen` side, in the order of their numbers: row by row from the `first`
 * corner, a ring clockwise from it; in reading order, or from the top of the ring, where `first` is not known.
 * Where all cavities are called by numbers, cavity n sits in seat n; otherwise they sit in the order of the table.
 * Cavities for which the face has no seat are left out (`cavitiesOutside` names them).
 */
export function seatsOf(connector: ConnectorBlock): readonly Seat[] {
  const places = placesOf(connector.layout, connector.first);
  const names = cavityNames(connector);
  const numbered = areNumbered(names);
  return places.map((place, at) => ({
    number: at + 1,
    cavity: numbered ? `${at + 1}` : (names[at] ?? null),
    place,
  }));
}

/** The cavities that the table names and the face has no seat for. */
export function cavitiesOutside(connector: ConnectorBlock): readonly string[] {
  const names = cavityNames(connector);
  const seats = placesOf(connector.layout, null).length;
  if (!areNumbered(names)) return names.slice(seats);
  return names.filter((name) => Number(name) < 1 || Number(name) > seats);
}

/** The cavities that a connector's table names, each once, in the order of the table. */
export function cavityNames(connector: Pick<ConnectorBlock, 'lines'>): readonly string[] {
  return [...new Set(connector.lines.map(({ cavity }) => cavity))];
}

function areNumbered(names: readonly string[]): boolean {
  return names.length > 0 && names.every((name) => /^(?:0|[1-9]\d*)$/.test(name));
}

function placesOf(layout: FaceLayout, first: Corner | null): readonly SeatPlace[] {
  if (layout.kind === 'ring') {
    const start = first === null ? 0 : ringStarts[first];
    const step = 360 / layout.cavities;
    return Array.from({ length: layout.cavities }, (_, at) => ({ kind: 'ring', degrees: (start + at * step) % 360 }));
  }
  const fromBottom = first === 'bottom left' || first === 'bottom right';
  const fromRight = first === 'top right' || first === 'bottom right';
  const rows = layout.rows.map((seats, row) => {
    const inRow = seats.flatMap((isCavity, column): SeatPlace[] => (isCavity ? [{ kind: 'rows', row, column }] : []));
    return fromRight ? inRow.toReversed() : inRow;
  });
  return (fromBottom ? rows.toReversed() : rows).flat();
}
