import { colourHex } from '../wire-colours/palette.ts';
import { element, type Drawing } from './drawing.ts';
import type { Face } from './face.ts';
import { planFace, seatSize } from './face-plan.ts';

/** A face too small to read: which connector it is, at a glance, by its shape and colours. Says nothing to a screen reader. */
export function drawFaceThumbnail(face: Face): Drawing {
  const { housing, seats } = planFace(face, face.seen, 0);
  const margin = 4;
  const frame = { fill: 'none', stroke: 'currentColor', 'stroke-width': 5 };
  const { round, x, y, width, height } = housing;
  const drawnSeats = seats.flatMap(({ seat, ...corner }) => {
    const colour = seat.wires[0]?.colours[0];
    const inside = { x: corner.x + 3, y: corner.y + 3, width: seatSize - 6, height: seatSize - 6, rx: 6 };
    const outline = element('rect', { ...inside, fill: 'none', stroke: 'currentColor', 'stroke-width': 3.5 });
    if (colour === undefined) return [outline];
    const { base, tracer } = colour;
    const band = { x: inside.x, y: corner.y + 30, width: inside.width, height: 15 };
    return [
      element('rect', { ...inside, fill: colourHex[base] }),
      ...(tracer === null ? [] : [element('rect', { ...band, fill: colourHex[tracer] })]),
      outline,
    ];
  });
  const scale = 0.24;
  return element(
    'svg',
    {
      class: 'face-thumbnail',
      viewBox: `${x - margin} ${y - margin} ${width + margin * 2} ${height + margin * 2}`,
      width: Math.round((width + margin * 2) * scale),
      height: Math.round((height + margin * 2) * scale),
      'aria-hidden': 'true',
      focusable: 'false',
    },
    round
      ? element('circle', { cx: x + width / 2, cy: y + height / 2, r: width / 2, ...frame })
      : element('rect', { x, y, width, height, rx: 8, ...frame }),
    ...drawnSeats,
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
