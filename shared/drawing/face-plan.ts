import type { FaceSide, LatchSide } from '../blocks/block.ts';
import type { Face, FaceSeat } from './face.ts';

/** Sizes of a drawn face in CSS pixels: a cavity is wide enough for a thumb (48 px at least). */
export const seatSize = 56;
const seatPitch = 68;
const housingMargin = 18;
const paperMargin = 26;
const headroom = 30;
const smallestWidth = 236;

/** Where a seat is drawn: its top left corner. */
export interface PlacedSeat {
  readonly seat: FaceSeat;
  readonly x: number;
  readonly y: number;
}

/** Everything that the drawing needs to know of where things stand. */
export interface FacePlan {
  readonly width: number;
  readonly height: number;
  readonly housing:
    | { readonly kind: 'box'; readonly x: number; readonly y: number; readonly width: number; readonly height: number }
    | { readonly kind: 'round'; readonly x: number; readonly y: number; readonly radius: number };
  readonly seats: readonly PlacedSeat[];
  readonly latch: LatchSide | null;
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
  return face.layout.kind === 'ring'
    ? planRing(face.layout.cavities, face.seats, mirrored, latch, footroom)
    : planRows(face.layout.rows, face.seats, mirrored, latch, footroom);
}

function mirroredLatch(latch: LatchSide | null): LatchSide | null {
  if (latch === 'left') return 'right';
  return latch === 'right' ? 'left' : latch;
}

function planRows(
  rows: readonly (readonly boolean[])[],
  seats: readonly FaceSeat[],
  mirrored: boolean,
  latch: LatchSide | null,
  footroom: number,
): FacePlan {
  const columns = Math.max(...rows.map((row) => row.length));
  const inner = columns * seatPitch - (seatPitch - seatSize);
  const housingWidth = inner + housingMargin * 2;
  const housingHeight = rows.length * seatPitch - (seatPitch - seatSize) + housingMargin * 2;
  const width = Math.max(housingWidth + paperMargin * 2, smallestWidth);
  const x = (width - housingWidth) / 2;
  const y = headroom + paperMargin;
  const placed = seats.flatMap((seat): PlacedSeat[] => {
    if (seat.place.kind !== 'rows') return [];
    const { row, column } = seat.place;
    // A shorter row stands in the middle, as staggered faces do.
    const indent = ((columns - (rows[row]?.length ?? columns)) * seatPitch) / 2;
    const fromLeft = indent + column * seatPitch;
    const left = mirrored ? inner - seatSize - fromLeft : fromLeft;
    return [{ seat, x: x + housingMargin + left, y: y + housingMargin + row * seatPitch }];
  });
  return {
    width,
    height: y + housingHeight + paperMargin + footroom,
    housing: { kind: 'box', x, y, width: housingWidth, height: housingHeight },
    seats: placed,
    latch,
  };
}

function planRing(
  cavities: number,
  seats: readonly FaceSeat[],
  mirrored: boolean,
  latch: LatchSide | null,
  footroom: number,
): FacePlan {
  const circle = cavities === 1 ? 0 : Math.max(seatPitch / (2 * Math.sin(Math.PI / Math.max(cavities, 2))), seatPitch * 0.6);
  const radius = circle + seatSize / 2 + housingMargin;
  const width = Math.max(radius * 2 + paperMargin * 2, smallestWidth);
  const centre = { x: width / 2, y: headroom + paperMargin + radius };
  const placed = seats.flatMap((seat): PlacedSeat[] => {
    if (seat.place.kind !== 'ring') return [];
    const angle = (seat.place.degrees * Math.PI) / 180;
    const across = Math.sin(angle) * circle * (mirrored ? -1 : 1);
    return [
      {
        seat,
        x: rounded(centre.x + across - seatSize / 2),
        y: rounded(centre.y - Math.cos(angle) * circle - seatSize / 2),
      },
    ];
  });
  return {
    width: rounded(width),
    height: rounded(centre.y + radius + paperMargin + footroom),
    housing: { kind: 'round', x: rounded(centre.x), y: rounded(centre.y), radius: rounded(radius) },
    seats: placed,
    latch,
  };
}

function rounded(pixels: number): number {
  return Math.round(pixels * 10) / 10;
}
