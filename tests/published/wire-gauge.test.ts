import { describe, expect, it } from 'vitest';
import { awgDiameterMillimetres, awgSquareMillimetres } from '../../shared/electrics/awg.ts';
import { copperResistance, copperResistivity, copperTemperatureCoefficient } from '../../shared/electrics/copper.ts';
import { jisWires } from '../../shared/electrics/jis-wire.ts';
import { quantity } from '../../shared/electrics/units.ts';
import { readWireSize } from '../../shared/electrics/wire-sizes.ts';

/*
 * Solid copper at 20 °C as printed: AWG 4–10 in an open textbook's wire table, AWG 5–24 in LinuxFocus's copy of the AWG
 * table; both give ASTM B258's diameters and IEC 60028's copper. Columns: gauge, diameter mm, area mm², Ω/km.
 */
const printed = [
  [4, 5.189, 21.2, 0.8152],
  [5, 4.621, 16.8, 1.028],
  [6, 4.115, 13.3, 1.296],
  [7, 3.665, 10.5, 1.634],
  [8, 3.264, 8.37, 2.061],
  [9, 2.906, 6.63, 2.599],
  [10, 2.588, 5.26, 3.277],
  [11, 2.305, 4.17, 4.132],
  [12, 2.053, 3.31, 5.211],
  [13, 1.828, 2.62, 6.571],
  [14, 1.628, 2.08, 8.286],
  [15, 1.45, 1.65, 10.45],
  [16, 1.291, 1.31, 13.17],
  [17, 1.15, 1.04, 16.61],
  [18, 1.024, 0.823, 20.95],
  [19, 0.912, 0.653, 26.42],
  [20, 0.812, 0.518, 33.31],
  [21, 0.723, 0.41, 42.0],
  [22, 0.644, 0.326, 52.96],
  [23, 0.573, 0.258, 66.79],
  [24, 0.511, 0.205, 84.22],
] as const;

function difference(value: number, reference: number): number {
  return Math.abs(value / reference - 1);
}

/** Half of a unit in the third figure, which is as far as the printed areas go. */
function halfOfThirdFigure(printedValue: number): number {
  return 0.5 * 10 ** (Math.floor(Math.log10(printedValue)) - 2);
}

describe('AWG 4 to 24 as printed', () => {
  it.each(printed)(
    'AWG %i: diameter, area and resistance',
    (gauge, millimetres, squareMillimetres, ohmsPerKilometre) => {
      expect(difference(awgDiameterMillimetres(gauge), millimetres)).toBeLessThan(0.001);
      expect(Math.abs(awgSquareMillimetres(gauge) - squareMillimetres)).toBeLessThanOrEqual(
        halfOfThirdFigure(squareMillimetres),
      );
      const ohms = copperResistance(quantity(1000), awgSquareMillimetres(gauge));
      expect(difference(ohms, ohmsPerKilometre)).toBeLessThan(0.0005);
    },
  );

  it('reads a gauge in a cell as the table has it', () => {
    for (const [gauge, , squareMillimetres] of printed) {
      const read = readWireSize(`AWG ${gauge}`)?.squareMillimetres ?? 0;
      expect(Math.abs(read - squareMillimetres)).toBeLessThanOrEqual(halfOfThirdFigure(squareMillimetres));
    }
  });

  /* Circular mils of an ASTM stranding data sheet; a circular mil is the area of a circle of 0.001 in. */
  it.each([
    [18, 1620],
    [16, 2580],
    [14, 4110],
    [12, 6530],
    [10, 10380],
    [8, 16510],
    [6, 26240],
    [4, 41740],
  ])('AWG %i is %i circular mils', (gauge, circularMils) => {
    expect(difference((awgDiameterMillimetres(gauge) / 0.0254) ** 2, circularMils)).toBeLessThan(0.003);
  });
});

describe('standard annealed copper (IEC 60028, 1925)', () => {
  it('has a conductivity of 58 MS/m and a resistivity of 0.017241 Ω·mm²/m', () => {
    expect(1 / copperResistivity).toBeCloseTo(58, 10);
    expect(copperResistivity).toBeCloseTo(0.017241, 6);
  });

  it('rises 0.00393 of its resistance a kelvin from 20 °C, which is 1/254.5', () => {
    expect(copperTemperatureCoefficient).toBe(0.00393);
    expect(copperTemperatureCoefficient).toBeCloseTo(1 / 254.5, 5);
  });

  it('has 10.37 Ω for a foot of one circular mil (general wire tables)', () => {
    const circularMil = (Math.PI / 4) * 0.0254 ** 2;
    expect(copperResistance(quantity(0.3048), quantity(circularMil))).toBeCloseTo(10.37, 2);
  });
});

/* JIS C 3406 AV wire as printed in a cable maker's sheet: size, strands, calculated mm², most mΩ/m, current limit A. */
const avWire = [
  ['0.5', '7/0.32', 0.5629, 32.7, 12],
  ['0.85', '11/0.32', 0.8846, 20.8, 16],
  ['1.25', '16/0.32', 1.287, 14.3, 21],
  ['2', '26/0.32', 2.091, 8.81, 28],
  ['3', '41/0.32', 3.297, 5.59, 38],
  ['5', '65/0.32', 5.228, 3.52, 51],
  ['8', '50/0.45', 7.952, 2.32, 66],
  ['15', '7/12/0.45', 13.36, 1.38, 94],
  ['20', '41/0.80', 20.61, 0.887, 121],
  ['0.5f', '20/0.18', 0.5087, 36.7, 12],
  ['0.75f', '30/0.18', 0.763, 24.4, 15],
  // The sheet's currents for these three are misprinted, and left out.
  ['1.25f', '50/0.18', 1.273, 14.7, null],
  ['2f', '37/0.26', 1.964, 9.5, null],
  ['3f', '61/0.26', 3.239, 5.76, null],
] as const;

describe('JIS C 3406 AV wire as printed', () => {
  it.each(avWire)('size %s', (size, strands, squareMillimetres, milliohmsPerMetre, currentLimit) => {
    expect(jisWires.find((wire) => wire.size === size)).toEqual({
      size,
      strands,
      squareMillimetres,
      milliohmsPerMetre,
      currentLimit,
    });
  });

  it('has no other sizes', () => {
    expect(jisWires.map(({ size }) => size)).toEqual(avWire.map(([size]) => size));
  });

  it('is never better than pure copper of its own area, and at most 9 % worse', () => {
    for (const { size, squareMillimetres, milliohmsPerMetre } of jisWires) {
      const pure = copperResistance(quantity(1), squareMillimetres) * 1000;
      expect(milliohmsPerMetre / pure, size).toBeGreaterThan(1);
      expect(milliohmsPerMetre / pure, size).toBeLessThan(1.09);
    }
  });
});
