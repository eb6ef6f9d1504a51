import { readDecimal } from '../lib/decimal.ts';
import { awgSquareMillimetres, finestGauge } from './awg.ts';

/** A wire's size as written and its copper's cross-section in square millimetres. */
export interface WireSize {
  readonly written: string;
  readonly squareMillimetres: number;
}

/** The range in which a written size is believed, in square millimetres; a number outside it is a slip. */
export const believedSquareMillimetres = { least: 0.05, most: 120 } as const;

const gaugePattern = /^(?:awg\s*#?\s*(\d{1,2}|[1-4]\/0)|(\d{1,2}|[1-4]\/0)\s*awg)$/i;
const strandsPattern = /^((?:\d{1,4}\s*\/\s*){1,2})(\d*[.,]\d+)\s*(?:mm)?$/i;
const squarePattern = /^(\d*[.,]?\d+)\s*f?\s*(?:mm\s*(?:²|2|\^2)|sq\.?\s*(?:mm)?)?$/i;

/**
 * Reads a wire's size: square millimetres (`0.85`, `0,85 mm²`, `1.25 sq`, and JIS's flexible `0.5f`), an American gauge
 * (`AWG 18`, `18 AWG`, `AWG 1/0`) or strands and their diameter in millimetres (`28/0.30`, `7/12/0.45`).
 * Gives null where it is none of them or no wire has that size.
 */
export function readWireSize(text: string): WireSize | null {
  const written = text.trim();
  const squareMillimetres = readGauge(written) ?? readStrands(written) ?? readSquareMillimetres(written);
  if (squareMillimetres === null) return null;
  const { least, most } = believedSquareMillimetres;
  return squareMillimetres >= least && squareMillimetres <= most ? { written, squareMillimetres } : null;
}

function readGauge(text: string): number | null {
  const match = gaugePattern.exec(text);
  const written = match?.[1] ?? match?.[2];
  if (written === undefined) return null;
  // 1/0 is gauge 0, 2/0 is gauge −1: the zeros are counted down from there.
  const gauge = written.endsWith('/0') ? 1 - Number(written[0]) : Number(written);
  return gauge > finestGauge ? null : awgSquareMillimetres(gauge);
}

function readStrands(text: string): number | null {
  const match = strandsPattern.exec(text);
  const diameter = match?.[2] === undefined ? null : readDecimal(match[2]);
  if (match?.[1] === undefined || diameter === null) return null;
  const strands = match[1]
    .split('/')
    .filter((part) => part.trim() !== '')
    .reduce((product, part) => product * Number(part), 1);
  return strands * (Math.PI / 4) * diameter ** 2;
}

function readSquareMillimetres(text: string): number | null {
  const match = squarePattern.exec(text);
  return match?.[1] === undefined ? null : readDecimal(match[1]);
}
