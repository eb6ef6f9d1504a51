import type { Brand } from '../lib/brand.ts';

/** A number that carries its unit in its type, so that metres never meet millimetres. */
export type Quantity<Unit extends string> = Brand<number, Unit>;

export type Metres = Quantity<'metres'>;
export type Millimetres = Quantity<'millimetres'>;
export type SquareMillimetres = Quantity<'square millimetres'>;
export type Ohms = Quantity<'ohms'>;
export type Amps = Quantity<'amps'>;
export type DegreesCelsius = Quantity<'degrees Celsius'>;

/**
 * Gives a number its unit; the one place where a bare number becomes a quantity.
 * @throws RangeError where the number is not finite
 */
export function quantity<Unit extends string>(value: number): Quantity<Unit> {
  if (!Number.isFinite(value)) throw new RangeError(`A quantity is a finite number, not ${value}`);
  return value as Quantity<Unit>;
}
