import type { WireColour } from '../wire-colours/colour-system.ts';
import { colourHex } from '../wire-colours/palette.ts';
import { element, type Drawing } from './drawing.ts';
import { seatSize } from './face-plan.ts';
import type { FaceWire } from './face.ts';
import { letterInk } from './ink.ts';

/** Where the wires' insulation stands in a seat: inside the wall, with the plate between. */
export const insulation = { from: 5, size: seatSize - 10 } as const;

const { from, size } = insulation;
const corner = 4;
const numberHeight = 12;

interface Strip {
  readonly y: number;
  readonly height: number;
  readonly only: boolean;
  /** How much of its upper left the number's plate covers. */
  readonly covered: number;
}

/**
 * The insulation of a cavity's wires, one under another: base colour, the tracer as a band along the foot, the letters on
 * the base and clear of the number's plate. A whole line parts two wires in one crimp, a dashed one the wires of different years or markets.
 */
export function drawInsulation(wires: readonly FaceWire[], either: boolean, plateWidth: number): readonly Drawing[] {
  const gap = either ? 0 : 2;
  const height = (size - gap * (wires.length - 1)) / wires.length;
  const strips = wires.map((wire, at): [FaceWire, Strip] => [
    wire,
    { y: from + at * (height + gap), height, only: wires.length === 1, covered: at === 0 ? Math.max(0, plateWidth + 1 - from) : 0 },
  ]);
  return [
    ...strips.flatMap(([wire, strip]) => drawStrip(wire, strip, either)),
    ...(either ? strips.slice(1).map(([, { y }]) => divider(y)) : []),
  ];
}

function drawStrip(wire: FaceWire, strip: Strip, either: boolean): readonly Drawing[] {
  const [colour, ...others] = wire.colours;
  const frame = {
    class: strip.only ? 'seat-inner' : undefined,
    x: from,
    y: round(strip.y),
    width: size,
    height: round(strip.height),
    rx: strip.only ? corner : either ? 0 : 3,
    'stroke-width': 1,
  };
  if (colour === undefined) return [element('rect', { ...frame, 'stroke-dasharray': '2 2' }), ...letters(wire, strip)];
  if (others.length === 0) {
    return [element('rect', { ...frame, fill: colourHex[colour.base] }), ...tracerOf(colour, strip, from, size), ...letters(wire, strip)];
  }
  // Letters that read as two colours are drawn as both, side by side, and never settled silently.
  const share = size / wire.colours.length;
  const halves = wire.colours.flatMap((one, at) => {
    const x = from + at * share;
    const body = { x: round(x), y: round(strip.y), width: round(share), height: round(strip.height) };
    return [element('rect', { ...body, fill: colourHex[one.base], stroke: 'none' }), ...tracerOf(one, strip, x, share)];
  });
  return [...halves, element('rect', frame), ...letters(wire, strip)];
}

/** The tracer as a band along the foot of the strip; a hairline keeps yellow apart from white, and black from blue. */
function tracerOf({ base, tracer }: WireColour, strip: Strip, x: number, width: number): readonly Drawing[] {
  if (tracer === null) return [];
  const band = strip.only ? 11 : Math.max(4, strip.height * 0.24);
  const y = strip.y + strip.height - band - (strip.only ? 4 : 1.5);
  return [
    element('rect', {
      class: 'tracer',
      x: round(x + 0.5),
      y: round(y),
      width: round(width - 1),
      height: round(band),
      fill: colourHex[tracer],
      stroke: letterInk(base),
      'stroke-width': 0.75,
    }),
  ];
}

/** The letters, as large as their number and the strip allow: on the base colour, or on a plate where that is in doubt. */
function letters({ code, colours }: FaceWire, strip: Strip): readonly Drawing[] {
  const short = code.length > 7 ? `${code.slice(0, 6)}…` : code;
  const written = code === '' || colours.length > 1 ? `${short}?` : short;
  const hasTracer = colours.some(({ tracer }) => tracer !== null);
  // In a seat with one wire the letters stand under the plate, in one with two beside it.
  const covered = strip.only ? 0 : strip.covered;
  const room = size - 6 - covered;
  const tallest = strip.only ? (hasTracer ? 17 : 19) : Math.min(13, strip.height * 0.62);
  const fontSize = Math.min(tallest, room / widthOf(written));
  const foot = hasTracer ? (strip.only ? 16 : Math.max(4, strip.height * 0.24) + 1.5) : 0;
  const head = strip.only ? numberHeight : 0;
  const middle = { x: from + size / 2 + covered / 2, y: strip.y + head + (strip.height - head - foot) / 2 };
  const [colour] = colours;
  const isInDoubt = colours.length > 1;
  const text = element(
    'text',
    {
      class: 'seat-letters',
      x: round(middle.x),
      y: round(middle.y + fontSize * 0.36),
      'font-size': round(fontSize),
      stroke: 'none',
      fill: colour === undefined ? 'currentColor' : isInDoubt ? colourHex.black : letterInk(colour.base),
    },
    written,
  );
  if (!isInDoubt) return [text];
  const half = { x: (widthOf(written) * fontSize) / 2 + 1, y: fontSize * 0.6 };
  const plate = { x: round(middle.x - half.x), y: round(middle.y - half.y), width: round(half.x * 2), height: round(half.y * 2), rx: 2 };
  return [element('rect', { ...plate, fill: colourHex.white, stroke: 'none' }), text];
}

/** How wide letters are in bold Merriweather, in ems; measured on its capitals, rounded up. */
function widthOf(text: string): number {
  return [...text].reduce((width, letter) => width + (/[WM]/.test(letter) ? 1.1 : /[A-Z…?]/.test(letter) ? 0.76 : /[\/.il1]/.test(letter) ? 0.42 : 0.62), 0.1);
}

function divider(y: number): Drawing {
  return element('path', {
    class: 'seat-divider',
    d: `M${from} ${round(y)}h${size}`,
    'stroke-width': 2,
    'stroke-dasharray': '5 3',
  });
}

function round(pixels: number): number {
  return Math.round(pixels * 10) / 10;
}
