import { quantity, type DegreesCelsius, type Metres, type Ohms, type SquareMillimetres } from './units.ts';

/** Resistivity of standard annealed copper at 20 °C in Ω·mm²/m: 1/58, IEC 60028 (1925). */
export const copperResistivity = 1 / 58;

/** How much copper's resistance rises a kelvin, of its value at 20 °C, at constant mass: 0.00393, IEC 60028. */
export const copperTemperatureCoefficient = 0.00393;

/**
 * The resistance of a length of copper wire.
 * @param length all the wire that the current goes through, out and back; 0 or more
 * @param crossSection the copper's own, more than 0
 * @param temperature of the copper, from −50 to 200 °C, where the coefficient holds; 20 °C if not given
 * @throws RangeError outside those ranges
 */
export function copperResistance(
  length: Metres,
  crossSection: SquareMillimetres,
  temperature: DegreesCelsius = quantity(20),
): Ohms {
  if (length < 0) throw new RangeError(`A length is 0 or more, not ${length} m`);
  if (crossSection <= 0) throw new RangeError(`A cross-section is more than 0, not ${crossSection} mm²`);
  if (temperature < -50 || temperature > 200) {
    throw new RangeError(`Copper is reckoned from −50 to 200 °C, not at ${temperature} °C`);
  }
  const at20 = (copperResistivity * length) / crossSection;
  return quantity(at20 * (1 + copperTemperatureCoefficient * (temperature - 20)));
}
