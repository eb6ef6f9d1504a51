import type { FaceSide } from '../blocks/block.ts';
import { drawHousing } from './draw-housing.ts';
import { drawSeat } from './draw-seat.ts';
import { element, type Drawing } from './drawing.ts';
import type { Face } from './face.ts';
import { planFace, seatSize, type HousingPlan, type PlacedSeat } from './face-plan.ts';

/** How a face is to be shown. */
export interface FaceLook {
  /** The side that one looks at: the table's own, or the other one. */
  readonly side: FaceSide;
  /** The cavity that is ringed, where one is chosen. */
  readonly ringed?: string | null;
  /** Where a cavity leads; null for one that leads nowhere. */
  readonly links?: (cavity: string) => string | null;
  /** What the face is called: the connector's name. */
  readonly title: string;
  /** Classes for the svg beside `face-drawing`. */
  readonly className?: string;
}

const unconfirmedRoom = 26;

/**
 * A connector's face seen from one side: the side is written above it, the latch drawn, the first cavity marked, or a
 * sentence under it that its numbering is not confirmed. Cavities are links where `links` says so, otherwise images.
 */
export function drawFace(face: Face, look: FaceLook): Drawing {
  const plan = planFace(face, look.side, face.oriented ? 0 : unconfirmedRoom);
  const links = look.links ?? ((): null => null);
  const contact = look.side === 'mating side' ? face.contacts : null;
  const seats = plan.seats.map((placed) => {
    const { cavity, number } = placed.seat;
    return drawSeat(placed, {
      ringed: cavity !== null && cavity === look.ringed,
      href: cavity === null ? null : links(cavity),
      contact,
      first: face.oriented && number === 1 ? cornerOf(placed, plan.housing) : null,
    });
  });
  const says = `Seen from the ${look.side}`;
  const latch = plan.latch === null ? '' : `, latch at the ${plan.latch}`;
  const doubt = face.oriented ? '' : ', numbering not confirmed: go by the colours';
  return element(
    'svg',
    {
      class: look.className === undefined ? 'face-drawing' : `face-drawing ${look.className}`,
      viewBox: `0 0 ${plan.width} ${plan.height}`,
      width: plan.width,
      height: plan.height,
      // More than six in a row do not fit a narrow phone at the size of a thumb: the style sheet lets them scroll.
      'data-across': Math.min(plan.across, 40),
      role: 'group',
      'aria-label': `${look.title}, ${says.toLowerCase()}${latch}${doubt}`,
      // All that is drawn inherits these.
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 1.5,
      'text-anchor': 'middle',
      'font-weight': 700,
      'font-size': 13,
    },
    words('face-side-name', 14, 14, says),
    ...drawHousing(plan, face.oriented),
    ...seats,
    face.oriented ? null : words('face-unconfirmed', plan.height - 8, 13, 'Numbering not confirmed: go by the colours'),
  );
}

/** A line of words on the paper; the svg's own label says it to a screen reader. */
function words(className: string, y: number, size: number, text: string): Drawing {
  const attributes = { class: className, x: 2, y, 'font-size': size, 'font-weight': 400, 'text-anchor': 'start' };
  return element('text', { ...attributes, fill: 'currentColor', stroke: 'none', 'aria-hidden': 'true' }, text);
}

/** Towards which corner of the housing a seat stands; the upper left one where it is in the middle. */
function cornerOf({ x, y }: PlacedSeat, housing: HousingPlan): { readonly across: number; readonly down: number } {
  const across = x + seatSize / 2 - (housing.x + housing.width / 2);
  const down = y + seatSize / 2 - (housing.y + housing.height / 2);
  return { across: across > 1 ? 1 : -1, down: down > 1 ? 1 : -1 };
}
