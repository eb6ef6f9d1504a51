import type { WireColour } from '../wire-colours/colour-system.ts';
import { colourHex } from '../wire-colours/palette.ts';
import { element, type Drawing } from './drawing.ts';

const length = 52;
const thickness = 14;

/**
 * A short length of cable: its base colour with the tracer as a line along it and its strands at the cut end. It says
 * nothing by itself: letters and words stand beside it.
 * @param colour base and tracer
 */
export function drawWire(colour: WireColour): Drawing {
  const top = 2;
  return element(
    'svg',
    {
      class: 'wire-drawing',
      viewBox: `0 0 ${length + 12} ${thickness + 4}`,
      width: length + 12,
      height: thickness + 4,
      'aria-hidden': 'true',
      focusable: 'false',
    },
    element('path', {
      class: 'wire-strands',
      d: `M${length} ${top + 4}h9M${length} ${top + 7}h11M${length} ${top + 10}h8`,
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 1.5,
    }),
    element('rect', {
      x: 1,
      y: top,
      width: length,
      height: thickness,
      rx: 2,
      fill: colourHex[colour.base],
    }),
    colour.tracer === null
      ? null
      : element('rect', { x: 1, y: top + 5, width: length, height: 4.5, fill: colourHex[colour.tracer] }),
    element('rect', {
      class: 'wire-outline',
      x: 1,
      y: top,
      width: length,
      height: thickness,
      rx: 2,
      fill: 'none',
      stroke: 'currentColor',
      'stroke-width': 1.25,
    }),
  );
}
