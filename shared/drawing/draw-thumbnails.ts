import { colourHex } from '../wire-colours/palette.ts';
import { element, type Drawing } from './drawing.ts';
import type { Face } from './face.ts';
import { planFace, seatSize } from './face-plan.ts';

/** A face too small to read: which connector it is, at a glance, by its shape and colours. Says nothing to a screen reader. */
export function drawFaceThumbnail(face: Face): Drawing {
  const plan = planFace(face, face.seen, 0);
  const { housing } = plan;
  const box =
    housing.kind === 'box'
      ? housing
      : { x: housing.x - housing.radius, y: housing.y - housing.radius, width: housing.radius * 2, height: housing.radius * 2 };
  const frame = { fill: 'none', stroke: 'currentColor', 'stroke-width': 5 };
  const seats = plan.seats.flatMap(({ seat, x, y }) => {
    const colour = seat.wires[0]?.colour ?? null;
    const place = { x, y, width: seatSize, rx: 6 };
    return [
      element('rect', { ...place, height: seatSize, fill: colour === null ? 'none' : colourHex[colour.base] }),
      ...(colour?.tracer ? [element('rect', { x, y: y + 34, width: seatSize, height: 16, fill: colourHex[colour.tracer] })] : []),
      element('rect', { ...place, height: seatSize, fill: 'none', stroke: 'currentColor', 'stroke-width': 4 }),
    ];
  });
  const margin = 6;
  return element(
    'svg',
    {
      class: 'face-thumbnail',
      viewBox: `${box.x - margin} ${box.y - margin} ${box.width + margin * 2} ${box.height + margin * 2}`,
      height: 40,
      'aria-hidden': 'true',
      focusable: 'false',
    },
    housing.kind === 'box'
      ? element('rect', { x: box.x, y: box.y, width: box.width, height: box.height, rx: 6, ...frame })
      : element('circle', { cx: housing.x, cy: housing.y, r: housing.radius, ...frame }),
    ...seats,
  );
}

/** Where each zone stands along the bike, from the headlight (0) to the tail (1). */
const zonePlaces: Readonly<Record<string, number>> = {
  headlight: 0.08,
  bars: 0.22,
  tank: 0.38,
  'engine left': 0.46,
  'engine right': 0.54,
  'left side cover': 0.66,
  'right side cover': 0.74,
  'under the seat': 0.82,
  tail: 0.95,
};

const mostInAColumn = 5;

/**
 * How many connectors a donor has in each zone, front of the bike to the left: a column of squares a zone over two
 * wheels. The numbers stand in words beside it.
 * @param zones the zones by the design's names; an unknown one stands in the middle
 */
export function drawZoneCounts(zones: readonly { readonly zone: string; readonly connectors: number }[]): Drawing {
  const width = 168;
  const ground = 74;
  const columns = zones.flatMap(({ zone, connectors }) => {
    const x = 10 + (zonePlaces[zone] ?? 0.6) * (width - 28);
    return Array.from({ length: Math.min(connectors, mostInAColumn) }, (_, at) =>
      element('rect', { x: Math.round(x), y: 42 - at * 9, width: 7, height: 7, fill: 'currentColor' }),
    );
  });
  const wheel = (x: number): Drawing =>
    element('circle', { cx: x, cy: ground - 12, r: 11, fill: 'none', stroke: 'currentColor', 'stroke-width': 1.5 });
  return element(
    'svg',
    { class: 'zone-drawing', viewBox: `0 0 ${width} ${ground}`, width, height: ground, 'aria-hidden': 'true', focusable: 'false' },
    element('path', { d: `M6 52H${width - 6}`, fill: 'none', stroke: 'currentColor', 'stroke-width': 1.5 }),
    wheel(28),
    wheel(width - 28),
    ...columns,
  );
}
