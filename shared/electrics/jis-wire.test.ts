import { expect, it } from 'vitest';
import { jisWires } from './jis-wire.ts';
import { readWireSize } from './wire-sizes.ts';

it('lists every wire with the area that its own strands add up to, within 1 %', () => {
  for (const { strands, squareMillimetres } of jisWires) {
    const ofStrands = readWireSize(strands)?.squareMillimetres ?? 0;
    expect(Math.abs(ofStrands / squareMillimetres - 1), strands).toBeLessThan(0.01);
  }
});
