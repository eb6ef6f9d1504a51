import type { FaceSide, LatchSide } from '../blocks/block.ts';
import type { Face, FaceSeat } from './face.ts';

/**
 * Sizes of a drawn face in CSS pixels. Six cavities in a row, shrunk to the 323 px that a narrow phone leaves, are still
 * 48 px wide each, the least for a thumb (WCAG 2.2, 2.5.5); a longer row scrolls inside its plate.
 */
export const seatSize = 54;
const seatGap = 3;
const seatPitch = seatSize + seatGap;
const wall = 8;
const tongue = 13;
const paperMargin = 2;
const headroom = 30;
const smallestWidth = 196;
const smallestUnconfirmed = 290;

/** Where a seat is drawn: its top left corner. */
export interface PlacedSeat {
  readonly seat: FaceSeat;
  readonly x: number;
  readonly y: number;
}

/** The housing's outline: a box, or a round one in the box around it. */
export interface HousingPlan {
  readonly round: boolean;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** Everything that the drawing needs to know of where things stand. */
export interface FacePlan {
  readonly width: number;
  readonly height: number;
  readonly housing: HousingPlan;
  readonly seats: readonly PlacedSeat[];
  readonly latch: LatchSide | null;
  readonly mirrored: boolean;
  /** The most cavities in a row; a ring counts as many as fit across it. */
  readonly across: number;
}

/** The other side of a connector. */
export function turned(side: FaceSide): FaceSide {
  return side === 'wire side' ? 'mating side' : 'wire side';
}

/**
 * Lays a face out as seen from one side: the other side than the table's is mirrored left to right.
 * @param face the connector's face
 * @param side the side that one looks at
 * @param footroom pixels to keep free under the housing for words
 */
export function planFace(face: Face, side: FaceSide, footroom: number): FacePlan {
  const mirrored = side !== face.seen;
  const latch = mirrored ? mirroredLatch(face.latch) : face.latch;
  const { layout } = face;
  const inner = layout.kind === 'ring' ? ringInner(face.seats) : rowsInner(layout.rows);
  const margins = {
    left: paperMargin + (latch === 'left' ? tongue : 0),
    right: paperMargin + (latch === 'right' ? tongue : 0),
    top: headroom + (latch === 'top' ? tongue : 0),
    bottom: paperMargin + (latch === 'bottom' ? tongue : 0),
  };
  const housing = {
    round: layout.kind === 'ring',
    // Where the words are wider than the face, it stands at the left, under their beginning.
    x: margins.left,
    y: margins.top,
    width: rounded(inner.width + wall * 2),
    height: rounded(inner.height + wall * 2),
  };
  const width = Math.max(housing.width + margins.left + margins.right, face.oriented ? smallestWidth : smallestUnconfirmed);
  const origin = { x: housing.x + wall, y: housing.y + wall };
  const seats = face.seats.map((seat) => {
    const { x, y } = placeOf(seat, inner, mirrored);
    return { seat, x: rounded(origin.x + x), y: rounded(origin.y + y) };
  });
  return {
    width: rounded(width),
    height: rounded(housing.y + housing.height + margins.bottom + footroom),
    housing,
    seats,
    latch,
    mirrored,
    across: Math.ceil(inner.width / seatPitch),
  };
}

interface Inner {
  readonly width: number;
  readonly height: number;
  readonly columns: readonly number[];
  readonly radius: number;
}

function rowsInner(rows: readonly (readonly boolean[])[]): Inner {
  const columns = rows.map((row) => row.length);
  return { width: extent(Math.max(...columns)), height: extent(rows.length), columns, radius: 0 };
}

function ringInner(seats: readonly FaceSeat[]): Inner {
  const radius = ringRadius(seats.flatMap(({ place }) => (place.kind === 'ring' ? [(place.degrees * Math.PI) / 180] : [])));
  // The corners of the seats stay inside the circle.
  const across = radius * 2 + seatSize * 1.25;
  return { width: across, height: across, columns: [], radius };
}

/** The smallest circle on which upright squares at these angles stand beside one another without touching. */
function ringRadius(angles: readonly number[]): number {
  if (angles.length < 2) return 0;
  const needed = angles.map((angle, at) => {
    const next = angles[(at + 1) % angles.length] ?? 0;
    const across = Math.abs(Math.sin(next) - Math.sin(angle));
    const down = Math.abs(Math.cos(next) - Math.cos(angle));
    return seatPitch / Math.max(across, down);
  });
  return Math.max(...needed);
}

function extent(seats: number): number {
  return seats * seatPitch - seatGap;
}

/** The top left corner of a seat inside the housing's wall. */
function placeOf({ place }: FaceSeat, inner: Inner, mirrored: boolean): { readonly x: number; readonly y: number } {
  if (place.kind === 'ring') {
    const angle = (place.degrees * Math.PI) / 180;
    const across = Math.sin(angle) * inner.radius * (mirrored ? -1 : 1);
    return {
      x: inner.width / 2 + across - seatSize / 2,
      y: inner.height / 2 - Math.cos(angle) * inner.radius - seatSize / 2,
    };
  }
  // A shorter row stands in the middle, as staggered faces do.
  const indent = (inner.width - extent(inner.columns[place.row] ?? 0)) / 2;
  const fromLeft = indent + place.column * seatPitch;
  return { x: mirrored ? inner.width - seatSize - fromLeft : fromLeft, y: place.row * seatPitch };
}

function mirroredLatch(latch: LatchSide | null): LatchSide | null {
  if (latch === 'left') return 'right';
  return latch === 'right' ? 'left' : latch;
}

function rounded(pixels: number): number {
  return Math.round(pixels * 10) / 10;
}
