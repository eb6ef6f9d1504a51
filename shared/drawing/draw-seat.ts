import { colourHex } from '../wire-colours/palette.ts';
import { element, type Drawing } from './drawing.ts';
import type { FaceWire } from './face.ts';
import { seatSize, type PlacedSeat } from './face-plan.ts';
import { letterInk } from './ink.ts';

const corner = 7;

/** How a seat is shown. */
export interface SeatLook {
  readonly ringed: boolean;
  readonly href: string | null;
  /** What the contact looks like from the mating side; null from the wire side. */
  readonly contact: 'pins' | 'sockets' | null;
  readonly first: boolean;
}

/** One cavity with what is in it, its number, and the double ring that marks the chosen one (hidden until it is). */
export function drawSeat({ seat, x, y }: PlacedSeat, look: SeatLook): Drawing {
  const name = seat.cavity ?? String(seat.number);
  const wires = seat.wires;
  const children = [
    ring(x, y, look.ringed),
    ...(wires.length === 0 ? emptySeat(x, y, name, seat.state === 'blank') : filledSeat(x, y, name, wires)),
    element('rect', {
      class: `seat-outline seat-${seat.state.replace(' ', '-')}`,
      x,
      y,
      width: seatSize,
      height: seatSize,
      rx: corner,
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 1.75,
      'stroke-dasharray': seat.state === 'unwritten' || seat.state === 'set back' ? '3 4' : undefined,
    }),
    seat.state === 'capped' ? cap(x, y) : null,
    look.contact === null ? null : contactSign(x, y, look.contact, wires[0] ?? null),
    look.first ? firstSign(x, y) : null,
  ];
  const attributes = {
    class: `seat${look.ringed ? ' ringed' : ''}`,
    'data-seat': seat.number,
    'data-cavity': name,
    'aria-label': seat.words,
  };
  return look.href === null
    ? element('g', { ...attributes, role: 'img' }, ...children)
    : element('a', { ...attributes, href: look.href }, ...children);
}

function ring(x: number, y: number, shown: boolean): Drawing {
  const circle = (distance: number): Drawing =>
    element('rect', {
      x: x - distance,
      y: y - distance,
      width: seatSize + distance * 2,
      height: seatSize + distance * 2,
      rx: corner + distance,
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 2,
    });
  return element('g', { class: 'ring', display: shown ? undefined : 'none' }, circle(3), circle(7));
}

function emptySeat(x: number, y: number, name: string, blank: boolean): Drawing[] {
  const strokes = Array.from({ length: 5 }, (_, at) => {
    const reach = 12 + at * 11;
    const from = Math.max(0, reach - (seatSize - 8));
    return `M${x + 4 + from} ${y + 4 + reach - from}L${x + 4 + reach - from} ${y + 4 + from}`;
  });
  return [
    element('rect', { class: 'seat-ground', x, y, width: seatSize, height: seatSize, rx: corner, fill: 'none' }),
    ...(blank
      ? [element('path', { class: 'hatch', d: strokes.join(''), fill: 'none', stroke: 'currentColor', 'stroke-width': 1 })]
      : []),
    element(
      'text',
      {
        class: 'seat-number on-paper',
        x: x + seatSize / 2,
        y: y + seatSize / 2 + 5,
        'text-anchor': 'middle',
        fill: 'currentColor',
      },
      name,
    ),
  ];
}

function filledSeat(x: number, y: number, name: string, wires: readonly FaceWire[]): Drawing[] {
  const shown = wires.slice(0, 3);
  const height = seatSize / shown.length;
  const bands = shown.flatMap((wire, at) => drawBand(wire, x, y + at * height, height, at === 0, at === shown.length - 1));
  const dividers = shown.slice(1).map((wire, at) =>
    element('path', {
      class: 'seat-divider',
      d: `M${x} ${y + (at + 1) * height}h${seatSize}`,
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 1.5,
      // A dashed line parts the wires of different bikes, a whole one two wires in one crimp.
      'stroke-dasharray': wire.further ? undefined : '4 3',
    }),
  );
  const base = shown[0]?.colour?.base;
  const ink = base === undefined ? 'currentColor' : letterInk(base);
  const number = element('text', { class: 'seat-number', x: x + 5, y: y + 14, fill: ink }, name);
  const place = { x: x + seatSize + 2, y: y + seatSize - 2 };
  const more = wires.length > 3 ? element('text', { class: 'seat-more', ...place, fill: 'currentColor' }, '…') : null;
  return [...bands, ...dividers, number, ...(more === null ? [] : [more])];
}

function drawBand(wire: FaceWire, x: number, y: number, height: number, first: boolean, last: boolean): Drawing[] {
  const base = wire.colour?.base ?? null;
  const tracer = wire.colour?.tracer ?? null;
  const stripe = height > 40 ? 13 : 7;
  const body = base === null ? 'none' : colourHex[base];
  const ink = base === null ? 'currentColor' : letterInk(base);
  const letters = height > 40 ? y + (tracer === null ? 38 : 33) : y + (height - (tracer === null ? 0 : stripe)) / 2 + 5;
  return [
    element('path', { d: bandPath(x, y, height, first, last), fill: body }),
    ...(tracer === null
      ? []
      : [
          element('path', {
            d: bandPath(x, y + height - stripe - (last ? 4 : 2), stripe, false, false),
            fill: colourHex[tracer],
          }),
        ]),
    element(
      'text',
      {
        class: height > 40 ? 'seat-letters' : 'seat-letters small',
        x: x + seatSize / 2 + (height > 40 || !first ? 0 : 6),
        y: Math.round(letters * 10) / 10,
        'text-anchor': 'middle',
        fill: ink,
      },
      wire.code.length > 6 ? `${wire.code.slice(0, 5)}…` : wire.code,
    ),
  ];
}

/** A band across the seat; the first has the seat's upper corners, the last its lower ones. */
function bandPath(x: number, y: number, height: number, first: boolean, last: boolean): string {
  const upper = first ? corner : 0;
  const lower = last ? corner : 0;
  return [
    `M${x + upper} ${y}h${seatSize - upper * 2}`,
    upper > 0 ? `a${upper} ${upper} 0 0 1 ${upper} ${upper}` : '',
    `v${height - upper - lower}`,
    lower > 0 ? `a${lower} ${lower} 0 0 1 ${-lower} ${lower}` : '',
    `h${-(seatSize - lower * 2)}`,
    lower > 0 ? `a${lower} ${lower} 0 0 1 ${-lower} ${-lower}` : '',
    `v${-(height - upper - lower)}`,
    upper > 0 ? `a${upper} ${upper} 0 0 1 ${upper} ${-upper}` : '',
    'z',
  ].join('');
}

/** A live lead that ends insulated wears a cap. */
function cap(x: number, y: number): Drawing {
  return element('path', {
    class: 'seat-cap',
    d: `M${x + 12} ${y - 2}v-6h${seatSize - 24}v6`,
    fill: 'none',
    stroke: 'currentColor',
    'stroke-width': 1.75,
  });
}

function contactSign(x: number, y: number, contact: 'pins' | 'sockets', wire: FaceWire | null): Drawing {
  const base = wire?.colour?.base;
  const ink = base === undefined ? 'currentColor' : letterInk(base);
  return element('circle', {
    class: 'seat-contact',
    cx: x + seatSize - 10,
    cy: y + 10,
    r: contact === 'pins' ? 2.5 : 3.5,
    fill: contact === 'pins' ? ink : 'none',
    stroke: ink,
    'stroke-width': 1.25,
  });
}

/** The first cavity wears a small solid corner outside its frame. */
function firstSign(x: number, y: number): Drawing {
  return element('path', { class: 'first-sign', d: `M${x - 9} ${y - 9}h13l-13 13z`, fill: 'currentColor' });
}
