import type { FaceSide } from '../blocks/block.ts';
import { drawSeat } from './draw-seat.ts';
import { element, type Drawing } from './drawing.ts';
import type { Face } from './face.ts';
import { planFace, type FacePlan } from './face-plan.ts';

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

/**
 * A connector's face seen from one side: the side is written above it, the latch drawn, the first cavity marked, or a
 * word under it that its numbering is not confirmed.
 */
export function drawFace(face: Face, look: FaceLook): Drawing {
  const plan = planFace(face, look.side, face.oriented ? 0 : 40);
  const links = look.links ?? ((): null => null);
  const firstSeat = face.oriented ? 1 : null;
  const drawn = plan.seats.map((placed) =>
    drawSeat(placed, {
      ringed: look.ringed !== undefined && look.ringed !== null && placed.seat.cavity === look.ringed,
      href: placed.seat.cavity === null ? null : links(placed.seat.cavity),
      contact: look.side === 'mating side' ? face.contacts : null,
      first: placed.seat.number === firstSeat,
    }),
  );
  const says = `Seen from the ${look.side}`;
  return element(
    'svg',
    {
      class: `face-drawing${look.className === undefined ? '' : ` ${look.className}`}`,
      viewBox: `0 0 ${plan.width} ${plan.height}`,
      width: plan.width,
      height: plan.height,
      role: 'group',
      'aria-label': `${look.title}, ${says.toLowerCase()}`,
    },
    element(
      'text',
      { class: 'face-side-name', x: plan.width / 2, y: 18, 'text-anchor': 'middle', fill: 'currentColor' },
      says,
    ),
    ...drawHousing(plan),
    ...drawn,
    face.oriented ? null : notConfirmed(plan),
  );
}

function drawHousing({ housing, latch }: FacePlan): Drawing[] {
  const stroke = { fill: 'none', stroke: 'currentColor', 'stroke-width': 2 };
  const outline =
    housing.kind === 'box'
      ? element('rect', {
          class: 'housing',
          x: housing.x,
          y: housing.y,
          width: housing.width,
          height: housing.height,
          rx: 3,
          ...stroke,
        })
      : element('circle', { class: 'housing', cx: housing.x, cy: housing.y, r: housing.radius, ...stroke });
  return latch === null ? [outline] : [outline, element('path', { class: 'latch', d: latchPath(housing, latch), ...stroke })];
}

/** The latch: a tongue on its side of the housing with a bar across its end. */
function latchPath(housing: FacePlan['housing'], latch: NonNullable<FacePlan['latch']>): string {
  const box =
    housing.kind === 'box'
      ? housing
      : { x: housing.x - housing.radius, y: housing.y - housing.radius, width: housing.radius * 2, height: housing.radius * 2 };
  const across = { x: box.x + box.width / 2, y: box.y + box.height / 2 };
  const half = 20;
  const out = 10;
  switch (latch) {
    case 'top':
      return `M${across.x - half} ${box.y}v${-out}h${half * 2}v${out}M${across.x - half + 6} ${box.y - out + 4}h${half * 2 - 12}`;
    case 'bottom':
      return `M${across.x - half} ${box.y + box.height}v${out}h${half * 2}v${-out}M${across.x - half + 6} ${box.y + box.height + out - 4}h${half * 2 - 12}`;
    case 'left':
      return `M${box.x} ${across.y - half}h${-out}v${half * 2}h${out}M${box.x - out + 4} ${across.y - half + 6}v${half * 2 - 12}`;
    case 'right':
      return `M${box.x + box.width} ${across.y - half}h${out}v${half * 2}h${-out}M${box.x + box.width + out - 4} ${across.y - half + 6}v${half * 2 - 12}`;
  }
}

function notConfirmed(plan: FacePlan): Drawing {
  const middle = plan.width / 2;
  return element(
    'text',
    { class: 'face-unconfirmed', x: middle, y: plan.height - 30, 'text-anchor': 'middle', fill: 'currentColor' },
    element('tspan', { x: middle }, 'Numbering not confirmed:'),
    element('tspan', { x: middle, dy: 18 }, 'go by the colours'),
  );
}
