import { describe, expect, it } from 'vitest';
import { connectorOf } from '../../tests/factories/connectors.ts';
import { anyVariant } from '../pages/applicability.ts';
import { colourNames } from '../wire-colours/colour-system.ts';
import { colourHex } from '../wire-colours/palette.ts';
import { drawFaceThumbnail, drawZoneCounts } from './draw-thumbnails.ts';
import { drawWire } from './draw-wire.ts';
import { drawingMarkup, element } from './drawing.ts';
import { faceOf } from './face.ts';

describe('Markup of drawings', () => {
  it('escapes every text and attribute and leaves out what is undefined', () => {
    const drawing = element('text', { class: 'a"b', x: 1, y: undefined }, '<&>"', null);
    expect(drawingMarkup(drawing)).toBe('<text class="a&quot;b" x="1">&lt;&amp;&gt;&quot;</text>');
  });
});

describe('A drawn wire', () => {
  it.each(colourNames)('has its base, its tracer along it, and an outline in the ink of the text: %s', (base) => {
    const tracer = base === 'white' ? 'red' : 'white';
    const markup = drawingMarkup(drawWire({ base, tracer }));
    expect(markup).toContain(`fill="${colourHex[base]}"`);
    expect(markup).toContain(`fill="${colourHex[tracer]}"`);
    expect(markup).toMatch(/class="wire-outline"[^>]* stroke="currentColor"/);
  });

  it('says nothing to a screen reader, since letters and words stand beside it', () => {
    expect(drawWire({ base: 'black', tracer: null }).attributes['aria-hidden']).toBe('true');
  });
});

describe('Small likenesses', () => {
  it('of a face shows each cavity once, wired ones in their colour', () => {
    const connector = connectorOf({ layout: 'round 3', seen: 'wire side' }, ['| 1 | Y/R |', '| 2 | – |', '| 3 | B |']);
    const markup = drawingMarkup(drawFaceThumbnail(faceOf(connector, anyVariant)));
    expect(markup.match(/stroke-width="3.5"/g)).toHaveLength(3);
    expect(markup).toContain(`fill="${colourHex.yellow}"`);
    expect(markup).toContain(`fill="${colourHex.red}"`);
    expect(markup).toContain('<circle');
  });

  it('of a donor has a square for each connector of a zone, front to the left', () => {
    const places = (zone: string): number[] => {
      const markup = drawingMarkup(drawZoneCounts([{ zone, connectors: 3 }]));
      return [...markup.matchAll(/<rect x="(\d+)"/g)].map(([, x]) => Number(x));
    };
    expect(places('headlight')).toHaveLength(3);
    expect(new Set(places('headlight')).size).toBe(1);
    expect(places('headlight')[0]).toBeLessThan(places('tank')[0] ?? 0);
    expect(places('tank')[0]).toBeLessThan(places('tail')[0] ?? 0);
    expect(places('nowhere')).toHaveLength(3);
  });
});
