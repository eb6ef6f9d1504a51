import { quantity, type Millimetres, type SquareMillimetres } from './units.ts';

/** The gauges that the book reads: 4/0, written −3, to 40. */
export const thickestGauge = -3;
/** The finest gauge that the book reads. */
export const finestGauge = 40;

/**
 * The diameter of a solid wire of an American wire gauge: 0.127 mm × 92^((36 − n) / 39), ASTM B258.
 * @param gauge a whole number from −3 (4/0) to 40
 * @throws RangeError outside that range
 */
export function awgDiameterMillimetres(gauge: number): Millimetres {
  if (!Number.isInteger(gauge) || gauge < thickestGauge || gauge > finestGauge) {
    throw new RangeError(`AWG is a whole number from ${thickestGauge} to ${finestGauge}, not ${gauge}`);
  }
  return quantity(0.127 * 92 ** ((36 - gauge) / 39));
}

/**
 * The copper's cross-section of an American wire gauge, in square millimetres, from its diameter (ASTM B258).
 * @param gauge a whole number from −3 (4/0) to 40
 * @throws RangeError outside that range
 */
export function awgSquareMillimetres(gauge: number): SquareMillimetres {
  return quantity((Math.PI / 4) * awgDiameterMillimetres(gauge) ** 2);
}
