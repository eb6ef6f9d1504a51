import { quantity, type Amps, type SquareMillimetres } from './units.ts';

/** A wire of JIS C 3406's AV table. */
export interface JisWire {
  /** As the standard calls it; `f` is the flexible kind. The nominal size is not the area. */
  readonly size: string;
  readonly strands: string;
  readonly squareMillimetres: SquareMillimetres;
  /** At most, at 20 °C. */
  readonly milliohmsPerMetre: number;
  /** Null where the sheet's own figure is misprinted. */
  readonly currentLimit: Amps | null;
}

function wire(size: string, strands: string, area: number, milliohmsPerMetre: number, amps: number | null): JisWire {
  const currentLimit: Amps | null = amps === null ? null : quantity(amps);
  return { size, strands, squareMillimetres: quantity(area), milliohmsPerMetre, currentLimit };
}

/**
 * Automotive low-voltage wire AV at 20 °C: JIS C 3406, as printed in a cable maker's sheet. The condition that the
 * current limits hold for was not in view, and a wire in a taped loom carries less.
 */
export const jisWires: readonly JisWire[] = [
  wire('0.5', '7/0.32', 0.5629, 32.7, 12),
  wire('0.85', '11/0.32', 0.8846, 20.8, 16),
  wire('1.25', '16/0.32', 1.287, 14.3, 21),
  wire('2', '26/0.32', 2.091, 8.81, 28),
  wire('3', '41/0.32', 3.297, 5.59, 38),
  wire('5', '65/0.32', 5.228, 3.52, 51),
  wire('8', '50/0.45', 7.952, 2.32, 66),
  wire('15', '7/12/0.45', 13.36, 1.38, 94),
  wire('20', '41/0.80', 20.61, 0.887, 121),
  wire('0.5f', '20/0.18', 0.5087, 36.7, 12),
  wire('0.75f', '30/0.18', 0.763, 24.4, 15),
  wire('1.25f', '50/0.18', 1.273, 14.7, null),
  wire('2f', '37/0.26', 1.964, 9.5, null),
  wire('3f', '61/0.26', 3.239, 5.76, null),
];
