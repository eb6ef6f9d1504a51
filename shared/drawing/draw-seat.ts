import { colourHex } from '../wire-colours/palette.ts';
import { drawInsulation, insulation } from './draw-insulation.ts';
import { element, type Drawing } from './drawing.ts';
import { seatSize, type PlacedSeat } from './face-plan.ts';

const corner = 8;

/*
 * A seat inherits from its face: no fill, strokes of 1.5 in the current colour, bold letters in the middle. What differs
 * is written on the element, so that a page with a hundred cavities stays small.
 */

/** How a seat is shown. */
export interface SeatLook {
  readonly ringed: boolean;
  readonly href: string | null;
  /** What the contact looks like from the mating side; null from the wire side. */
  readonly contact: 'pins' | 'sockets' | null;
  /** Towards which corner of the housing the first cavity stands, -1 or 1 across and down; null for all others. */
  readonly first: { readonly across: number; readonly down: number } | null;
}

/**
 * One cavity: its wall, the wire's insulation in it with its letters, its number on a small plate of its own, so that it
 * is read on any colour. The chosen one is ringed twice: its wall and its insulation's edge (the style sheet does the
 * same to the cavity whose row is the page's target).
 */
export function drawSeat({ seat, x, y }: PlacedSeat, look: SeatLook): Drawing {
  const name = seat.cavity ?? String(seat.number);
  // Two wires need the room beside the number for their letters; the other seats show the contact.
  const contact = seat.wires.length > 1 ? null : look.contact;
  const plate = numberPlate(seat.more ? `${shortName(name)}+` : shortName(name), contact);
  const doubtful = seat.state === 'unwritten' || seat.state === 'set back';
  const children = [
    look.first === null ? null : firstSign(look.first.across, look.first.down),
    element('rect', {
      class: 'seat-wall',
      ...box(1, corner - 1),
      // The whole square takes a tap, where it is hatched or empty too.
      'pointer-events': 'all',
      'stroke-width': look.ringed ? 4 : undefined,
      'stroke-dasharray': doubtful && !look.ringed ? '4 3' : undefined,
    }),
    ...(seat.wires.length === 0 && seat.state === 'blank' ? [hatch()] : []),
    ...drawInsulation(seat.wires, seat.either, plate.width),
    seat.wires.length === 1 && !look.ringed ? null : innerRing(look.ringed),
    seat.state === 'capped' ? cap() : null,
    ...plate.drawings,
  ];
  const attributes = {
    class: `seat seat-${seat.state.replace(' ', '-')}${look.ringed ? ' ringed' : ''}`,
    transform: `translate(${x} ${y})`,
    'data-seat': seat.number,
    'data-cavity': name,
    'aria-label': seat.words,
  };
  return look.href === null
    ? element('g', { ...attributes, role: 'img' }, ...children)
    : element('a', { ...attributes, href: look.href }, ...children);
}

function box(inset: number, radius: number): Readonly<Record<string, number>> {
  const size = seatSize - inset * 2;
  return { x: inset, y: inset, width: size, height: size, rx: radius };
}

/** The inner of the two rings, for seats whose one wire has no edge of its own to ring. */
function innerRing(shown: boolean): Drawing {
  return element('rect', {
    class: 'seat-inner',
    ...box(insulation.from, 4),
    stroke: shown ? undefined : 'none',
    'stroke-width': shown ? 2.5 : undefined,
  });
}

/** An empty cavity is hatched; one that nobody has written down is left open. */
function hatch(): Drawing {
  const { from, size } = insulation;
  const step = 9;
  const lines: string[] = [];
  for (let reach = step; reach < size * 2; reach += step) {
    const over = Math.max(0, reach - size);
    lines.push(`M${from + over} ${from + reach - over}L${from + reach - over} ${from + over}`);
  }
  return element('path', { class: 'hatch', d: lines.join(''), 'stroke-width': 1 });
}

function shortName(name: string): string {
  return name.length > 5 ? `${name.slice(0, 4)}…` : name;
}

/**
 * The cavity's number on a plate at the top left, with a `+` after it where more wires are in the cavity; from the mating
 * side also its contact.
 */
function numberPlate(
  name: string,
  contact: SeatLook['contact'],
): { readonly width: number; readonly drawings: readonly Drawing[] } {
  const letters = Math.max(17, 7 + [...name].reduce((sum, letter) => sum + (/[A-Z]/.test(letter) ? 10.5 : 8.5), 0));
  const width = Math.min(letters + (contact === null ? 0 : 11), seatSize - 2);
  const drawings = [
    element('path', {
      class: 'seat-plate',
      d: `M1 ${corner}a7 7 0 0 1 7 -7h${width - 7}v13a4 4 0 0 1 -4 4h${-(width - 4)}z`,
      fill: colourHex.white,
    }),
    element('text', { class: 'seat-number', x: 1 + letters / 2, y: 14, fill: colourHex.black, stroke: 'none' }, name),
    ...(contact === null ? [] : [contactSign(contact, letters)]),
  ];
  return { width, drawings };
}

/** A live lead that ends insulated wears a cap over its end. */
function cap(): Drawing {
  const middle = seatSize / 2;
  return element('path', {
    class: 'seat-cap',
    d: `M${middle - 4} ${seatSize - 3}v-8h20v8M${middle} ${seatSize - 7}h12`,
    fill: colourHex.white,
    stroke: colourHex.black,
  });
}

/** A pin is solid, a socket hollow. */
function contactSign(contact: 'pins' | 'sockets', x: number): Drawing {
  const inset = contact === 'pins' ? 0 : 0.75;
  const size = 8 - inset * 2;
  const place = { class: `seat-contact contact-${contact}`, x: x + inset, y: 5.5 + inset, width: size, height: size };
  return contact === 'pins'
    ? element('rect', { ...place, fill: colourHex.black, stroke: 'none' })
    : element('rect', { ...place, stroke: colourHex.black });
}

/** The first cavity wears a solid corner, outside its wall and towards the corner from which one counts. */
function firstSign(across: number, down: number): Drawing {
  const middle = seatSize / 2;
  const x = middle + across * (middle + 6);
  const y = middle + down * (middle + 6);
  return element('path', { class: 'first-sign', d: `M${x} ${y}h${-across * 17}L${x} ${y - down * 17}z`, fill: 'currentColor', stroke: 'none' });
}
