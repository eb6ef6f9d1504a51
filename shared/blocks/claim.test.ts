import { describe, expect, it } from 'vitest';
import { blockOf } from '../../tests/factories/source-blocks.ts';
import { claimOf } from './claim.ts';
import type { TableBlock } from './block.ts';

/** What the lines of a block claim. */
function claims(block: TableBlock): readonly string[] {
  return block.lines.map((line) => claimOf(block, line));
}

const connectorHeading =
  '| Cavity | Wire | mm² | Circuit | Goes to | Years | Markets | Note | Cite |\n| - | - | - | - | - | - | - | - | - |';

function ofCavity(row: string, attributes = ''): string {
  const { block } = blockOf(
    'connector',
    `:::connector{#plug layout="2" ${attributes}}\n${connectorHeading}\n${row}\n:::`,
  );
  return claims(block)[0] ?? '';
}

function ofWire(row: string): string {
  const heading = '| From | To | Wire | mm² | Length | Note |\n| - | - | - | - | - | - |';
  return claims(blockOf('wires', `:::wires\n${heading}\n${row}\n:::`).block)[0] ?? '';
}

describe('the claim of a cavity', () => {
  const plain = ofCavity('| 1 | Y/R | 0.85 | Main beam | b.1, a.2 | | UK, EU | | |');

  it('is the same however the same thing is written', () => {
    expect(ofCavity('| 1 | YR | 0,85 mm² | main  beam | a.2, b.1 | | EU, uk | | |')).toBe(plain);
    expect(ofCavity('| 1 | yellow with a red stripe | 0.85 | Main beam | b.1; a.2 | | UK, EU | | |')).toBe(plain);
  });

  it('is about neither the note nor the source, nor how the face is drawn', () => {
    expect(ofCavity('| 1 | Y/R | 0.85 | Main beam | b.1, a.2 | | UK, EU | stiff | m2 |', 'name="Plug" cite="m1"')).toBe(
      plain,
    );
  });

  it.each([
    ['the colour', '| 1 | Y/B | 0.85 | Main beam | b.1, a.2 | | UK, EU | | |'],
    ['the size', '| 1 | Y/R | 1.25 | Main beam | b.1, a.2 | | UK, EU | | |'],
    ['the circuit', '| 1 | Y/R | 0.85 | Dip beam | b.1, a.2 | | UK, EU | | |'],
    ['an end', '| 1 | Y/R | 0.85 | Main beam | b.1 | | UK, EU | | |'],
    ['the years', '| 1 | Y/R | 0.85 | Main beam | b.1, a.2 | 1980- | UK, EU | | |'],
    ['the markets', '| 1 | Y/R | 0.85 | Main beam | b.1, a.2 | | UK | | |'],
    ['the cavity', '| 2 | Y/R | 0.85 | Main beam | b.1, a.2 | | UK, EU | | |'],
    ['that it is blank', '| 1 | – | | | | | UK, EU | | |'],
    ['that it is capped', '| 1 | Y/R | 0.85 | Main beam | capped | | UK, EU | | |'],
  ])('changes with %s', (_, row) => {
    expect(ofCavity(row)).not.toBe(plain);
  });

  it('keeps two meanings of one spelling apart from either', () => {
    expect(new Set([ofCavity('| 1 | BR |'), ofCavity('| 1 | Br |'), ofCavity('| 1 | B/R |')]).size).toBe(3);
  });
});

describe('the claim of a wire', () => {
  it('has no direction', () => {
    expect(ofWire('| a.1 | b.1 | R | 3 | 0.25 | |')).toBe(ofWire('| b.1 | a.1 | R | 3.0 | 250 mm | x |'));
  });

  it('changes where the wire is taken away, or its length', () => {
    expect(ofWire('| a.1 | b.1 | removed | | | |')).not.toBe(ofWire('| a.1 | b.1 | | | | |'));
    expect(ofWire('| a.1 | b.1 | R | 3 | 0.25 | |')).not.toBe(ofWire('| a.1 | b.1 | R | 3 | 0.35 | |'));
  });
});

describe('the claims of other lines', () => {
  it('of a component are its kind, its figures and its earth, not its name', () => {
    const of = (row: string): string => {
      const heading = '| Id | Kind | Name | Rating | Earthed by |\n| - | - | - | - | - |';
      return claims(blockOf('components', `:::components\n${heading}\n${row}\n:::`).block)[0] ?? '';
    };
    const fuse = of('| main-fuse | fuse | Main fuse | 35 A blow | |');
    expect(of('| main-fuse | fuse | The fuse | 35A (blow) | |')).toBe(fuse);
    expect(of('| main-fuse | fuse | Main fuse | 35 A | |')).not.toBe(fuse);
    expect(of('| main-fuse | breaker | Main fuse | 35 A blow | |')).not.toBe(fuse);
    expect(of('| main-fuse | fuse | Main fuse | as fitted | |')).not.toBe(
      of('| main-fuse | fuse | Main fuse | bridged | |'),
    );
    expect(of('| horn | load | Horn | 30 W | frame |')).not.toBe(of('| horn | load | Horn | 30 W | engine |'));
  });

  it('of a position are the contacts that it joins, in whatever order the columns stand', () => {
    const of = (heading: string, row: string): string =>
      claims(blockOf('switch', `:::switch{#ignition}\n${heading}\n|-|-|-|-|\n${row}\n:::`).block)[0] ?? '';
    const on = of('| Position | R | BR | L |', '| On | ● | ● | |');
    expect(of('| Position | L | BR | R |', '| on | | x | x |')).toBe(on);
    expect(of('| Position | R | BR | L |', '| On | ● | | ● |')).not.toBe(on);
  });

  it('of the inside of a unit keep its direction, for a diode has one', () => {
    const of = (row: string): string =>
      claims(blockOf('inside', `:::inside{#unit}\n| From | To | As | When |\n|-|-|-|-|\n${row}\n:::`).block)[0] ?? '';
    expect(of('| a | k | diode | |')).not.toBe(of('| k | a | diode | |'));
    expect(of('| a | k | joins | KILL at open |')).not.toBe(of('| a | k | joins | KILL at earth |'));
    expect(of('| a | k | resistor 20 Ω | |')).not.toBe(of('| a | k | resistor 30 Ω | |'));
  });

  it('of a check are its place, its figures and how it is done, not what it is called', () => {
    const of = (row: string): string =>
      claims(blockOf('checks', `:::checks\n| Check | Between | Expect | At |\n|-|-|-|-|\n${row}\n:::`).block)[0] ?? '';
    const coil = of('| Pickup | igniter.1 – igniter.2 | 100–130 Ω | 20 °C |');
    expect(of('| Coil | igniter.2 - igniter.1 | 100 to 130 Ω | 20 °C |')).toBe(coil);
    expect(of('| Pickup | igniter.1 – igniter.2 | 100–140 Ω | 20 °C |')).not.toBe(coil);
    expect(of('| Pickup | igniter.1 – igniter.2 | 100–130 Ω | 80 °C |')).not.toBe(coil);
  });

  it('survive being sent as JSON', () => {
    const { block } = blockOf('wires', ':::wires\n| From | To |\n| - | - |\n| b.1 | a.1 |\n:::');
    const [line] = block.lines;
    const [copy] = structuredClone(block).lines;
    expect(line && copy && claimOf(block, line) === claimOf(block, copy)).toBe(true);
  });
});
