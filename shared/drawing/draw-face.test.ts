import { describe, expect, it } from 'vitest';
import { connectorOf } from '../../tests/factories/connectors.ts';
import { anyVariant } from '../pages/applicability.ts';
import { colourNames } from '../wire-colours/colour-system.ts';
import { colourHex } from '../wire-colours/palette.ts';
import { drawFace } from './draw-face.ts';
import { drawingMarkup, type Drawing } from './drawing.ts';
import { faceOf } from './face.ts';
import { planFace, seatSize, turned } from './face-plan.ts';
import { contrast, letterInk } from './ink.ts';

function all(drawing: Drawing): readonly Drawing[] {
  return [drawing, ...drawing.children.flatMap((child) => (typeof child === 'string' ? [] : all(child)))];
}

function words(drawing: Drawing): readonly string[] {
  return all(drawing).flatMap(({ children }) => children.filter((child) => typeof child === 'string'));
}

function withClass(drawing: Drawing, name: string): readonly Drawing[] {
  return all(drawing).filter(({ attributes }) => String(attributes['class'] ?? '').split(' ').includes(name));
}

const rows = ['| 1 | Y/R | Main beam |', '| 2 | B | Earth |', '| 3 | – | |', '| 4 | W |', '| 5 | L/W |', '| 6 | G |'];
const oriented = { layout: '2x3', seen: 'wire side', first: 'top left', latch: 'left', contacts: 'pins' };
const face = faceOf(connectorOf(oriented, rows), anyVariant);
const look = { side: face.seen, title: 'Headlight bucket' };

describe('A drawn face', () => {
  it('names the side that one looks at, and turned over names the other', () => {
    expect(words(drawFace(face, look))).toContain('Seen from the wire side');
    expect(words(drawFace(face, { ...look, side: turned(face.seen) }))).toContain('Seen from the mating side');
    expect(drawFace(face, look).attributes['aria-label']).toBe('Headlight bucket, seen from the wire side, latch at the left');
    expect(drawFace(face, { ...look, side: 'mating side' }).attributes['aria-label']).toBe(
      'Headlight bucket, seen from the mating side, latch at the right',
    );
  });

  it('is mirrored left to right when it is turned over, and back when it is turned again', () => {
    const seen = planFace(face, 'wire side', 0);
    const other = planFace(face, 'mating side', 0);
    expect(seen.latch).toBe('left');
    expect(other.latch).toBe('right');
    const fromLeft = seen.seats.map(({ x }) => x - seen.housing.x);
    const fromRight = other.seats.map(({ x }) => other.housing.x + other.housing.width - (x + seatSize));
    fromLeft.forEach((distance, at) => expect(fromRight[at]).toBeCloseTo(distance, 1));
    expect(other.seats.map(({ y }) => y)).toEqual(seen.seats.map(({ y }) => y));
    expect(other.seats.map(({ seat }) => seat.cavity)).toEqual(seen.seats.map(({ seat }) => seat.cavity));
    expect(planFace(face, turned(turned('wire side')), 0)).toEqual(seen);
  });

  it('puts the first cavity of each corner into that corner', () => {
    const corners = { 'top left': [0, 0], 'top right': [2, 0], 'bottom left': [0, 1], 'bottom right': [2, 1] };
    for (const [first, [column, row]] of Object.entries(corners)) {
      const plan = planFace(faceOf(connectorOf({ ...oriented, first }, rows), anyVariant), 'wire side', 0);
      const xs = [...new Set(plan.seats.map(({ x }) => x))].toSorted((a, b) => a - b);
      const ys = [...new Set(plan.seats.map(({ y }) => y))].toSorted((a, b) => a - b);
      expect([xs.indexOf(plan.seats[0]?.x ?? -1), ys.indexOf(plan.seats[0]?.y ?? -1)]).toEqual([column, row]);
    }
  });

  it('marks the first cavity, or says that the numbering is not confirmed', () => {
    const drawn = drawFace(face, look);
    expect(withClass(drawn, 'first-sign')).toHaveLength(1);
    expect(words(drawn).join(' ')).not.toContain('not confirmed');
    const doubtful = faceOf(connectorOf({ layout: '2x3', seen: 'wire side', latch: 'top' }, rows), anyVariant);
    const drawnInDoubt = drawFace(doubtful, look);
    expect(withClass(drawnInDoubt, 'first-sign')).toHaveLength(0);
    expect(words(drawnInDoubt)).toContain('Numbering not confirmed: go by the colours');
    expect(drawnInDoubt.attributes['aria-label']).toContain('numbering not confirmed');
  });

  it('draws every cavity with its number and its letters, hatches the empty one, and says each in words', () => {
    const drawn = drawFace(face, look);
    const seats = withClass(drawn, 'seat');
    expect(seats.map(({ attributes }) => [attributes['data-cavity'], attributes['data-seat'], attributes['aria-label']])).toEqual([
      ['1', 1, 'cavity 1, yellow, red tracer, main beam'],
      ['2', 2, 'cavity 2, black, earth'],
      ['3', 3, 'cavity 3, empty'],
      ['4', 4, 'cavity 4, white'],
      ['5', 5, 'cavity 5, blue, white tracer'],
      ['6', 6, 'cavity 6, green'],
    ]);
    expect(seats.map(words)).toEqual([['Y/R', '1'], ['B', '2'], ['3'], ['W', '4'], ['L/W', '5'], ['G', '6']]);
    expect(withClass(drawn, 'hatch')).toHaveLength(1);
    expect(withClass(drawn, 'tracer')).toHaveLength(2);
  });

  it('gives every cavity a square of at least 48 px, also six in a row on a narrow phone', () => {
    expect(seatSize).toBeGreaterThanOrEqual(48);
    const six = planFace(faceOf(connectorOf({ ...oriented, layout: '6', latch: 'top' }, rows), anyVariant), 'wire side', 0);
    expect((323 / six.width) * seatSize).toBeGreaterThanOrEqual(48);
  });

  it('keeps cavities apart, in rows, with gaps and on rings of every number', () => {
    const layouts = ['1', '3+4', 'xx.xx+xxxxx', '.x.x.', ...Array.from({ length: 24 }, (_, at) => `round ${at + 1}`)];
    for (const layout of layouts) {
      for (const side of ['wire side', 'mating side'] as const) {
        const plan = planFace(faceOf(connectorOf({ ...oriented, layout }, rows), anyVariant), side, 0);
        for (const [at, one] of plan.seats.entries()) {
          expect(one.x).toBeGreaterThanOrEqual(plan.housing.x);
          expect(one.x + seatSize).toBeLessThanOrEqual(plan.housing.x + plan.housing.width);
          expect(one.y + seatSize).toBeLessThanOrEqual(plan.height);
          for (const other of plan.seats.slice(at + 1)) {
            const apart = Math.max(Math.abs(one.x - other.x), Math.abs(one.y - other.y));
            expect(apart, `${layout}: ${one.seat.number} and ${other.seat.number}`).toBeGreaterThanOrEqual(seatSize);
          }
        }
      }
    }
  });

  it('makes links of cavities that lead somewhere, and images of the others', () => {
    const drawn = drawFace(face, { ...look, links: (cavity) => (cavity === '2' ? '#headlight.2' : null) });
    const [one, two] = withClass(drawn, 'seat');
    expect(one).toMatchObject({ tag: 'g', attributes: { role: 'img' } });
    expect(two).toMatchObject({ tag: 'a', attributes: { href: '#headlight.2' } });
  });

  it('rings the chosen cavity twice and no other', () => {
    const [ringed, ...others] = withClass(drawFace(face, { ...look, ringed: '5' }), 'ringed');
    expect(others).toEqual([]);
    expect(ringed?.attributes['data-cavity']).toBe('5');
    if (ringed === undefined) throw new Error('No cavity is ringed.');
    const rings = all(ringed).filter(
      ({ attributes }) => ['seat-wall', 'seat-inner'].includes(String(attributes['class'])) && Number(attributes['stroke-width'] ?? 0) > 2,
    );
    expect(rings).toHaveLength(2);
    expect(withClass(drawFace(face, look), 'ringed')).toEqual([]);
  });

  it('shows what the contacts are from the mating side only', () => {
    expect(withClass(drawFace(face, look), 'seat-contact')).toHaveLength(0);
    expect(withClass(drawFace(face, { ...look, side: 'mating side' }), 'contact-pins')).toHaveLength(6);
  });

  it('uses no colour but those of wires; every other line is of the text around it', () => {
    const palette = new Set(Object.values(colourHex).map((hex) => hex.toLowerCase()));
    for (const { attributes } of all(drawFace(face, { ...look, ringed: '1', side: 'mating side' }))) {
      for (const name of ['fill', 'stroke']) {
        const value = String(attributes[name] ?? 'none').toLowerCase();
        expect(value === 'none' || value === 'currentcolor' || palette.has(value), `${name} ${value}`).toBe(true);
      }
    }
  });

  it('never writes what a member wrote as markup', () => {
    const hostile = faceOf(connectorOf({ ...oriented, layout: '1' }, ['| <b>"x | </text><script> | "><img> |']), anyVariant);
    const markup = drawingMarkup(drawFace(hostile, { ...look, title: '"><script>', links: () => '#"><script>' }));
    expect(markup).not.toMatch(/<script|<img|<b>/);
  });
});

describe('The ink of letters on a wire', () => {
  it.each(colourNames)('can be read on %s (WCAG 2.2, 1.4.3: 4.5 to 1)', (colour) => {
    expect(contrast(colourHex[colour], letterInk(colour))).toBeGreaterThanOrEqual(4.5);
  });

  it('reckons contrast as WCAG 2.2 does: black on white is 21 to 1', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 5);
    expect(contrast('#777777', '#ffffff')).toBeCloseTo(4.48, 2);
  });
});
