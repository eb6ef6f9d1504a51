import { colourHex } from '../wire-colours/palette.ts';
import { drawInsulation, insulation } from './draw-insulation.ts';
import { element, type Drawing } from './drawing.ts';
import { seatSize, type PlacedSeat } from './face-plan.ts';

const corner = 8;

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
 * is read on any colour; the double ring of the chosen one is there and hidden until it is chosen.
 */
export function drawSeat({ seat, x, y }: PlacedSeat, look: SeatLook): Drawing {
  const name = seat.cavity ?? String(seat.number);
  // Two wires need the room beside the number for their letters; the other seats show the contact.
  const contact = seat.wires.length > 1 ? null : look.contact;
  const plate = numberPlate(seat.more ? `${shortName(name)}+` : shortName(name), contact);
  const doubtful = seat.state === 'unwritten' || seat.state === 'set back';
  const children = [
    look.first === null ? null : firstSign(look.first.across, look.first.down),
    // The whole square takes a tap, the hatched and empty part too.
    box(0, { class: 'seat-ground', fill: 'none', 'pointer-events': 'all' }),
    box(1, {
      class: 'seat-wall',
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 1.5,
      'stroke-dasharray': doubtful ? '4 3' : undefined,
    }),
    ...(seat.wires.length === 0 ? emptySeat(seat.state === 'blank') : drawInsulation(seat.wires, seat.either, plate.width)),
    seat.state === 'capped' ? cap() : null,
    ring(look.ringed),
    ...plate.drawings,
  ];
  const attributes = {
    class: ['seat', `seat-${seat.state.replace(' ', '-')}`, look.ringed ? 'ringed' : ''].filter((word) => word !== '').join(' '),
    transform: `translate(${x} ${y})`,
    'data-seat': seat.number,
    'data-cavity': name,
    'aria-label': seat.words,
  };
  return look.href === null
    ? element('g', { ...attributes, role: 'img' }, ...children)
    : element('a', { ...attributes, href: look.href }, ...children);
}

function box(inset: number, attributes: Readonly<Record<string, string | number | undefined>>): Drawing {
  const size = seatSize - inset * 2;
  return element('rect', { x: inset, y: inset, width: size, height: size, rx: corner - inset, ...attributes });
}

/** Ringed twice: once around the wall, once inside it; between the two the plate shows. */
function ring(shown: boolean): Drawing {
  const line = { fill: 'none', stroke: 'currentColor' };
  return element(
    'g',
    { class: 'ring', visibility: shown ? undefined : 'hidden' },
    box(0.5, { ...line, 'stroke-width': 4 }),
    box(5.5, { ...line, 'stroke-width': 2.5 }),
  );
}

/** An empty cavity is hatched; one that nobody has written down is left open. */
function emptySeat(blank: boolean): readonly Drawing[] {
  if (!blank) return [];
  const { from, size } = insulation;
  const step = 9;
  const lines: string[] = [];
  for (let reach = step; reach < size * 2; reach += step) {
    const over = Math.max(0, reach - size);
    lines.push(`M${from + over} ${from + reach - over}L${from + reach - over} ${from + over}`);
  }
  return [element('path', { class: 'hatch', d: lines.join(''), fill: 'none', stroke: 'currentColor', 'stroke-width': 1 })];
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
  const width = letters + (contact === null ? 0 : 11);
  const drawings = [
    element('path', {
      class: 'seat-plate',
      d: `M1 ${corner}a7 7 0 0 1 7 -7h${width - 7}v13a4 4 0 0 1 -4 4h${-(width - 4)}z`,
      fill: colourHex.white,
      stroke: 'currentColor',
      'stroke-width': 1.5,
    }),
    element(
      'text',
      {
        class: 'seat-number',
        x: 1 + letters / 2,
        y: 14,
        'text-anchor': 'middle',
        'font-size': 13,
        'font-weight': 700,
        fill: colourHex.black,
      },
      name,
    ),
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
    stroke: 'currentColor',
    'stroke-width': 1.5,
  });
}

/** A pin is solid, a socket hollow. */
function contactSign(contact: 'pins' | 'sockets', x: number): Drawing {
  const inset = contact === 'pins' ? 0 : 0.75;
  return element('rect', {
    class: `seat-contact contact-${contact}`,
    x: x + inset,
    y: 5.5 + inset,
    width: 8 - inset * 2,
    height: 8 - inset * 2,
    fill: contact === 'pins' ? colourHex.black : 'none',
    stroke: contact === 'pins' ? 'none' : colourHex.black,
    'stroke-width': 1.5,
  });
}

/** The first cavity wears a solid corner, outside its wall and towards the corner from which one counts. */
function firstSign(across: number, down: number): Drawing {
  const middle = seatSize / 2;
  const x = middle + across * (middle + 6);
  const y = middle + down * (middle + 6);
  return element('path', { class: 'first-sign', d: `M${x} ${y}h${-across * 17}L${x} ${y - down * 17}z`, fill: 'currentColor' });
}
